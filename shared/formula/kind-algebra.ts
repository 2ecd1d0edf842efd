/**
 * Kinds under arithmetic: what comes of adding, multiplying and dividing quantities
 * of two kinds. Deliberately mild: where it is not plain what comes out, it is
 * `number`, which goes with everything. Common practice, no source.
 */
import type { Kind } from '../model/kinds.ts';

export interface Inferred {
  readonly kind: Kind;
  /**
   * Multiplied or divided by a bare number on the way, which may have changed what it
   * is (a yearly cost by 12 is a month's), so it is held to its kind less strictly.
   */
  readonly scaled: boolean;
}

export const NUMBER: Inferred = { kind: 'number', scaled: false };

export const inferred = (kind: Kind, scaled = false): Inferred => ({ kind, scaled });

const MONEY: ReadonlySet<Kind> = new Set(['money', 'costPerYear', 'costPerCycle', 'costOnce']);
export const isMoney = (kind: Kind): boolean => MONEY.has(kind);

/** Kinds that say little about what they may be added to. */
const NEUTRAL: ReadonlySet<Kind> = new Set(['number', 'ratio', 'count']);

/** Unordered pairs as text. */
const pair = (a: Kind, b: Kind): string => (a < b ? `${a} ${b}` : `${b} ${a}`);

const NEVER_ADDED: ReadonlySet<string> = new Set([
  pair('probability', 'rate'),
  pair('probability', 'time'),
  pair('rate', 'time'),
  pair('rate', 'utility'),
  pair('rate', 'disabilityWeight'),
  pair('time', 'utility'),
  pair('time', 'disabilityWeight'),
  pair('utility', 'disabilityWeight'),
]);

/** The kind of a sum, difference or choice of the two; `clash` where they cannot go together. */
export function addKinds(a: Inferred, b: Inferred): Inferred | 'clash' {
  const scaled = a.scaled || b.scaled;
  if (a.kind === b.kind) return inferred(a.kind, scaled);
  if (NEUTRAL.has(a.kind)) return NEUTRAL.has(b.kind) ? mixNeutral(a, b) : b;
  if (NEUTRAL.has(b.kind)) return a;
  if (isMoney(a.kind) && isMoney(b.kind)) return addMoney(a, b);
  if (a.kind === 'logOdds' || b.kind === 'logOdds') return addToLogOdds(a, b);
  const clash = isMoney(a.kind) || isMoney(b.kind) || NEVER_ADDED.has(pair(a.kind, b.kind));
  return clash && !scaled ? 'clash' : NUMBER;
}

/** A bare number leaves a ratio a ratio (1 - reduction); a ratio and a count make neither. */
function mixNeutral(a: Inferred, b: Inferred): Inferred {
  if (a.kind === 'number') return b;
  return b.kind === 'number' ? a : NUMBER;
}

/** A price may join any flow; flows over different times may not join each other. */
function addMoney(a: Inferred, b: Inferred): Inferred | 'clash' {
  if (a.kind === 'money') return b;
  if (b.kind === 'money') return a;
  return a.scaled || b.scaled ? inferred('money') : 'clash';
}

/** Linear predictors take covariates of any kind, but no money. */
function addToLogOdds(a: Inferred, b: Inferred): Inferred | 'clash' {
  const clash = (isMoney(a.kind) || isMoney(b.kind)) && !a.scaled && !b.scaled;
  return clash ? 'clash' : inferred('logOdds');
}

const PRODUCTS: ReadonlyMap<string, Kind> = new Map([
  [pair('rate', 'money'), 'costPerYear'],
  [pair('rate', 'costOnce'), 'costPerYear'],
  [pair('perCycle', 'money'), 'costPerCycle'],
  [pair('perCycle', 'costOnce'), 'costPerCycle'],
  [pair('costPerYear', 'time'), 'money'],
  [pair('costPerCycle', 'time'), 'money'],
  [pair('money', 'time'), 'money'],
  [pair('costOnce', 'time'), 'money'],
  [pair('money', 'count'), 'money'],
  [pair('costOnce', 'count'), 'costOnce'],
  [pair('costPerYear', 'count'), 'costPerYear'],
  [pair('costPerCycle', 'count'), 'costPerCycle'],
  [pair('utility', 'utility'), 'utility'],
  [pair('disabilityWeight', 'disabilityWeight'), 'disabilityWeight'],
  [pair('count', 'count'), 'count'],
]);

const byNumber = ({ kind }: Inferred): Inferred =>
  kind === 'number' ? NUMBER : inferred(kind, true);

/** The kind of a product: a probability or ratio of something is that something. */
export function multiplyKinds(a: Inferred, b: Inferred): Inferred {
  if (a.kind === 'number') return byNumber(b);
  if (b.kind === 'number') return byNumber(a);
  const scaled = a.scaled || b.scaled;
  if (a.kind === 'ratio') return inferred(b.kind, scaled);
  if (b.kind === 'ratio') return inferred(a.kind, scaled);
  if (a.kind === 'probability') return inferred(b.kind, scaled);
  if (b.kind === 'probability') return inferred(a.kind, scaled);
  const isPredictor = a.kind === 'logOdds' || b.kind === 'logOdds';
  if (isPredictor && !isMoney(a.kind) && !isMoney(b.kind)) return inferred('logOdds', scaled);
  return inferred(PRODUCTS.get(pair(a.kind, b.kind)) ?? 'number', scaled);
}

/** Ordered: what is divided, then by what. */
const QUOTIENTS: ReadonlyMap<string, Kind> = new Map([
  ['money time', 'costPerYear'],
  ['costOnce time', 'costPerYear'],
  ['count time', 'rate'],
  ['costPerYear rate', 'money'],
  ['money count', 'money'],
  ['costOnce count', 'costOnce'],
  ['costPerYear count', 'costPerYear'],
  ['costPerCycle count', 'costPerCycle'],
]);

/** The kind of a quotient: like by like is a ratio. */
export function divideKinds(a: Inferred, b: Inferred): Inferred {
  if (b.kind === 'number') return byNumber(a);
  if (a.kind === 'number') return NUMBER;
  const scaled = a.scaled || b.scaled;
  if (a.kind === b.kind || (isMoney(a.kind) && isMoney(b.kind))) return inferred('ratio');
  if (b.kind === 'ratio' || b.kind === 'probability') return inferred(a.kind, scaled);
  return inferred(QUOTIENTS.get(`${a.kind} ${b.kind}`) ?? 'number', scaled);
}

/** A probability or ratio to a power stays what it is. */
export function powerKind(base: Inferred): Inferred {
  return base.kind === 'probability' || base.kind === 'ratio' ? base : NUMBER;
}
