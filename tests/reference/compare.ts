/** Where two simulators differ on one model: an empty list where they agree. */
import type { StrategyRun } from '../../shared/engine/results.ts';
import type { ModelDocument } from '../../shared/model/document.ts';
import type { ReferenceRun } from './simulate.ts';

const TOLERANCE = 1e-9;

/**
 * Amounts below this share of the model's largest are compared with that size in
 * place of their own, for they are what is left where larger ones cancel.
 */
const SMALL = 1e-3;

/** The largest absolute payoff of each measure: the size that small amounts are held against. */
export function sizes(document: ModelDocument, runs: readonly ReferenceRun[]) {
  const largest = (measure: 'cost' | 'outcome'): number => {
    const ids = document.payoffs.filter((each) => each.measure === measure).map(({ id }) => id);
    return Math.max(
      0,
      ...runs.flatMap(({ byPayoff }) =>
        byPayoff.filter(({ payoff }) => ids.includes(payoff)).map(({ total }) => Math.abs(total)),
      ),
    );
  };
  return { cost: largest('cost'), outcome: largest('outcome') };
}

export function differs(got: number | undefined, want: number, size: number): boolean {
  if (got === undefined || !Number.isFinite(got)) return true;
  return Math.abs(got - want) > TOLERANCE * Math.max(Math.abs(want), SMALL * size);
}

export function differences(
  document: ModelDocument,
  got: readonly StrategyRun[],
  want: readonly ReferenceRun[],
): string[] {
  const size = sizes(document, want);
  const found: string[] = [];
  const check = (what: string, a: number | undefined, b: number, scale: number): void => {
    if (differs(a, b, scale)) found.push(`${what}: got ${a}, want ${b}`);
  };
  want.forEach((run, s) => {
    const other = got[s];
    check(`${run.id} cost`, other?.cost, run.cost, size.cost);
    check(`${run.id} outcome`, other?.outcome, run.outcome, size.outcome);
    check(`${run.id} lifeYears`, other?.lifeYears, run.lifeYears, document.question.horizon);
    run.byProfile.forEach((profile, p) => {
      const own = other?.byProfile[p];
      const name = `${run.id} ${profile.id}`;
      if (own?.id !== profile.id) found.push(`${name}: got ${own?.id}`);
      check(`${name} cost`, own?.cost, profile.cost, size.cost);
      check(`${name} outcome`, own?.outcome, profile.outcome, size.outcome);
      check(`${name} lifeYears`, own?.lifeYears, profile.lifeYears, document.question.horizon);
    });
    found.push(...payoffDifferences(document, other, run, size));
    if (other?.trace?.length !== run.trace.length) found.push(`${run.id} trace length`);
    run.trace.forEach((row, k) => {
      row.forEach((share, i) => {
        check(`${run.id} trace ${k} ${i}`, other?.trace?.[k]?.[i], share, 1);
      });
    });
  });
  return found;
}

type Sizes = ReturnType<typeof sizes>;

/** Both ways: what is missing on either side counts as 0. */
function payoffDifferences(
  document: ModelDocument,
  got: StrategyRun | undefined,
  want: ReferenceRun,
  size: Sizes,
): string[] {
  const key = (each: { payoff: string; state: string | null }) => `${each.payoff} ${each.state}`;
  const gotten = new Map(got?.byPayoff.map((each) => [key(each), each.total]));
  const wanted = new Map(want.byPayoff.map((each) => [key(each), each.total]));
  return [...new Set([...gotten.keys(), ...wanted.keys()])].flatMap((name) => {
    const [id] = name.split(' ');
    const { measure } = document.payoffs.find((each) => each.id === id) ?? { measure: 'cost' };
    const [a, b] = [gotten.get(name) ?? 0, wanted.get(name) ?? 0];
    return differs(a, b, size[measure]) ? [`${want.id} ${name}: got ${a}, want ${b}`] : [];
  });
}
