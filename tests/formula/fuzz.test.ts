/**
 * 50,000 formulas from one seed: random token soups, well-formed formulas, mutations
 * of these, deep brackets, long chains, unicode and hostile names. None may throw, and a
 * fair share must parse. FUZZ_SEED picks another seed.
 */
import { expect, it } from 'vitest';
import type { Expr } from '../../shared/formula/expr.ts';
import { CALLABLE, FUNCTIONS } from '../../shared/formula/functions.ts';
import { inferKind } from '../../shared/formula/kinds.ts';
import { checkNames, namesIn } from '../../shared/formula/names.ts';
import { readFormula } from '../../shared/formula/parse.ts';
import { checkPlace, type Place } from '../../shared/formula/places.ts';
import { buildScope } from '../../shared/formula/scope.ts';
import { documentWith, EVERY_KIND, table, variables } from './documents.ts';

const COUNT = 50_000;
const seed = Number(process.env.FUZZ_SEED ?? 20_261_201);

/** Mulberry32: small, fast, good enough to pick test cases. */
function randomFrom(start: number): () => number {
  let state = start >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let t = Math.imul(state ^ (state >>> 15), state | 1);
    t ^= t + Math.imul(t ^ (t >>> 7), t | 61);
    return ((t ^ (t >>> 14)) >>> 0) / 4_294_967_296;
  };
}

const random = randomFrom(seed);
const below = (n: number) => Math.floor(random() * n);
const pick = <T>(list: readonly T[]): T => list[below(list.length)] as T;
const repeat = (n: number, make: () => string, by: string) =>
  Array.from({ length: n }, make).join(by);

const HOSTILE = [
  '__proto__',
  'constructor',
  'prototype',
  'toString',
  'valueOf',
  'hasOwnProperty',
  'this',
  'null',
  'undefined',
  'NaN',
  'Infinity',
  'eval',
  'Function',
  '__defineGetter__',
  'then',
];
const NAMES = [
  ...EVERY_KIND.map(({ symbol }) => symbol),
  ...['v', 'w', 'life', 'time', 'age', 'cycle', 'cycle_length', 'time_in_state', 'true', 'false'],
];
const NUMBERS = ['0', '1', '2.5', '.5', '1e-3', '3E+2', '0.035', '12', '1e308', '1e-320'];
const OPERATORS = ['+', '-', '*', '/', '^', '<', '<=', '>', '>=', '==', '!=', ' and ', ' or '];
const STRAY = ['=', '.', '[', ']', '{', '}', "'", '"', '`', '?', ':', ';', '&&', '||', '!', '%'];
const ODD = ['\\', '@', '#', '$', '/*', '//', '\u0000', '\u00a0', '\u2212', '\u{1F600}', '\ud800'];
const LETTERS = ['caf\u00e9', '\u03b2', '\u4eba', 'e\u0301', '\u202e'];

const name = () => (random() < 0.05 ? pick(HOSTILE) : pick(NAMES));

/** A well-formed formula, operators and calls at most `depth` inside one another. */
function wellFormed(depth: number): string {
  const kind = depth <= 0 ? below(2) : below(8);
  if (kind === 0) return pick(NUMBERS);
  if (kind === 1) return name();
  if (kind === 2) return `(${wellFormed(depth - 1)})`;
  if (kind === 3) return `-${wellFormed(depth - 1)}`;
  if (kind === 4) return `(not ${wellFormed(depth - 1)})`;
  if (kind === 5) return call(depth);
  // Brackets around one side keep comparisons from chaining.
  return `(${wellFormed(depth - 1)})${pick(['', ' '])}${pick(OPERATORS)} (${wellFormed(depth - 1)})`;
}

function call(depth: number): string {
  const fn = pick(CALLABLE);
  const { min = 1, max = 1 } = FUNCTIONS.get(fn) ?? {};
  const count = random() < 0.9 ? Math.min(min + below(3), max) : below(6);
  return `${fn}(${repeat(count, () => wellFormed(depth - 1), ', ')})`;
}

const token = () => {
  const lists = [NAMES, NAMES, NUMBERS, OPERATORS, OPERATORS, ['(', ')', ',', ' ', 'not ', 'if(']];
  const rare = [STRAY, ODD, LETTERS, HOSTILE, CALLABLE.map((fn) => `${fn}(`)];
  return pick(random() < 0.9 ? pick(lists) : pick(rare));
};

function mutated(text: string): string {
  let result = text;
  for (let times = 1 + below(3); times > 0; times -= 1) {
    const at = below(result.length + 1);
    const cut = below(4);
    result = result.slice(0, at) + (random() < 0.6 ? token() : '') + result.slice(at + cut);
  }
  return result;
}

/** Texts made to hurt: nesting, chains, length. */
function extreme(): string {
  const n = below(1_000);
  switch (below(8)) {
    case 0:
      return `${'('.repeat(n)}1${')'.repeat(n)}`;
    case 1:
      return '-'.repeat(n) + name();
    case 2:
      return repeat(n, name, pick(OPERATORS));
    case 3:
      return `${'abs('.repeat(n)}1${')'.repeat(n)}`;
    case 4:
      return `sum(${repeat(n, name, ',')})`;
    case 5:
      return 'not '.repeat(n) + name();
    case 6:
      return '('.repeat(n * 10);
    default:
      return 'x'.repeat(n * 10);
  }
}

function formula(index: number): string {
  if (index % 250 === 0) return extreme();
  const kind = below(10);
  if (kind < 3) return repeat(1 + below(12), token, random() < 0.5 ? '' : ' ');
  if (kind < 6) return mutated(wellFormed(3));
  return wellFormed(1 + below(4));
}

const { scope } = buildScope(
  documentWith({
    parameters: EVERY_KIND,
    tables: [table('life')],
    variables: variables({ v: '1', w: '2' }),
  }),
);
const PLACES: readonly Place[] = [
  { type: 'kind', kind: 'probability' },
  { type: 'kind', kind: 'costPerCycle' },
  { type: 'outcome', per: 'year' },
];

/** The tree as text, to compare trees. */
function shape(expr: Expr): string {
  if (expr.type !== 'call') return expr.type === 'number' ? String(expr.value) : expr.name;
  return `${expr.fn}(${expr.args.map(shape).join()})`;
}

function someNode(expr: Expr): Expr {
  if (expr.type !== 'call' || expr.args.length === 0 || random() < 0.3) return expr;
  return someNode(pick(expr.args));
}

/** What holds of every answer; true where the text parsed. */
function examine(text: string): boolean {
  const parsed = readFormula(text);
  if (!parsed.expr) {
    for (const { at, code } of parsed.issues) {
      expect(code).toMatch(/^formula\.(?!syntax)/);
      expect(at === undefined || (at.start >= 0 && at.start < at.end)).toBe(true);
      expect((at?.end ?? 0) <= text.length).toBe(true);
    }
    return false;
  }
  const { expr } = parsed;
  namesIn(expr);
  const issues = [
    ...checkNames(expr, scope, { timeInState: false }),
    ...inferKind(expr, scope).issues,
    ...checkPlace(expr, inferKind(expr, scope).kind, pick(PLACES), {
      measure: 'qaly',
      cycleLength: 0.5,
    }),
  ];
  for (const { at } of issues) if (!at || at.end > text.length) throw new Error('no place');
  const part = someNode(expr);
  const again = readFormula(text.slice(part.at.start, part.at.end));
  if (!again.expr || shape(again.expr) !== shape(part)) throw new Error('the place is wrong');
  return true;
}

it(`reads ${COUNT} formulas without an error of its own (seed ${seed})`, {
  timeout: 60_000,
}, () => {
  let parsed = 0;
  for (let index = 0; index < COUNT; index += 1) {
    const text = formula(index);
    try {
      if (examine(text)) parsed += 1;
    } catch (cause) {
      const shown = JSON.stringify(text.slice(0, 300));
      throw new Error(`seed ${seed}, formula ${index}: ${shown}`, { cause });
    }
  }
  // Four in ten are well formed; some mutations stay so.
  expect(parsed).toBeGreaterThan(COUNT * 0.4);
  expect(parsed).toBeLessThan(COUNT * 0.8);
});
