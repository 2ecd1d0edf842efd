/**
 * Which kind cannot stand where another is wanted. What is not listed passes in
 * silence. An error cannot be right; a warning may be meant. Common practice, no source.
 */
import type { Issue, IssueParams, Path, Span } from '../model/issue.ts';
import type { Kind } from '../model/kinds.ts';
import type { Inferred } from './kind-algebra.ts';

type Severity = Issue['severity'];
type Wrong = Partial<Record<Kind, Severity>>;

const errors = (...kinds: Kind[]): Wrong =>
  Object.fromEntries(kinds.map((kind) => [kind, 'error' as const]));
const warnings = (...kinds: Kind[]): Wrong =>
  Object.fromEntries(kinds.map((kind) => [kind, 'warning' as const]));

const MONEY: Kind[] = ['money', 'costPerYear', 'costPerCycle', 'costOnce'];
const NO_MONEY: Kind[] = [
  'probability',
  'rate',
  'perCycle',
  'logOdds',
  'utility',
  'disabilityWeight',
  'time',
];

const WRONG: Readonly<Record<Kind, Wrong>> = {
  probability: {
    ...errors('rate', 'logOdds', 'utility', 'disabilityWeight', 'time', 'count', ...MONEY),
    ...warnings('perCycle'),
  },
  rate: {
    ...errors('probability', 'logOdds', 'utility', 'disabilityWeight', 'time', ...MONEY),
    ...warnings('perCycle'),
  },
  perCycle: {
    ...errors('logOdds', 'utility', 'disabilityWeight', 'time', ...MONEY),
    ...warnings('rate'),
  },
  ratio: errors('rate', 'logOdds', 'time', ...MONEY),
  logOdds: {
    ...errors('probability', 'rate', 'utility', 'disabilityWeight', ...MONEY),
    ...warnings('ratio'),
  },
  utility: errors('rate', 'logOdds', 'disabilityWeight', 'time', ...MONEY),
  disabilityWeight: errors('rate', 'logOdds', 'utility', 'time', ...MONEY),
  costPerYear: { ...errors(...NO_MONEY), ...warnings('costPerCycle', 'costOnce') },
  costPerCycle: { ...errors(...NO_MONEY), ...warnings('costPerYear', 'costOnce') },
  costOnce: { ...errors(...NO_MONEY), ...warnings('costPerYear', 'costPerCycle') },
  money: errors(...NO_MONEY),
  time: errors('probability', 'rate', 'logOdds', 'utility', 'disabilityWeight', ...MONEY),
  count: errors('logOdds', 'utility', 'disabilityWeight', ...MONEY),
  number: {},
};

/** Mistakes common enough to have words of their own: `wanted got` to code. */
const NAMED: ReadonlyMap<string, string> = new Map([
  ['probability rate', 'formula.rateAsProbability'],
  ['rate probability', 'formula.probabilityAsRate'],
  ['costPerCycle costPerYear', 'formula.yearlyCostPerCycle'],
  ['costPerYear costPerCycle', 'formula.cycleCostPerYear'],
  ['utility disabilityWeight', 'formula.disabilityAsUtility'],
  ['disabilityWeight utility', 'formula.utilityAsDisability'],
]);

/** Mistakes that a bare number does not make right (a rate / 12 is no monthly probability). */
const STILL_DOUBTFUL: ReadonlySet<string> = new Set(['probability rate', 'rate probability']);

/** How wrong a quantity is where a kind is wanted; undefined where it may be right. */
export function severityOf(wanted: Kind, got: Inferred): Severity | undefined {
  if (!got.scaled) return WRONG[wanted][got.kind];
  return STILL_DOUBTFUL.has(`${wanted} ${got.kind}`) ? 'warning' : undefined;
}

/** `formula.kindMismatch`, or the mistake's own code; params wanted and got are kinds. */
export function mismatchIssue(
  severity: Severity,
  wanted: Kind,
  got: Kind,
  at: Span,
  params: IssueParams = {},
): Issue {
  const code = NAMED.get(`${wanted} ${got}`) ?? 'formula.kindMismatch';
  const path: Path = [];
  return { code, severity, path, params: { wanted, got, ...params }, at };
}
