import { describe, expect, it } from 'vitest';
import { inferred } from '../../shared/formula/kind-algebra.ts';
import { inferKind } from '../../shared/formula/kinds.ts';
import { parseFormula } from '../../shared/formula/parse.ts';
import { buildScope } from '../../shared/formula/scope.ts';
import { documentWith, EVERY_KIND, table, variables } from './documents.ts';

const { scope } = buildScope(
  documentWith({
    parameters: EVERY_KIND,
    tables: [table('deaths', 1, 'rate'), table('plain')],
    variables: variables({ free: 'r', said: 'n' }, { said: 'utility' }),
  }),
);

function infer(text: string) {
  const { expr } = parseFormula(text);
  if (!expr) throw new Error(text);
  return inferKind(expr, scope, new Map([['free', inferred('rate')]]));
}

const issuesOf = (text: string) =>
  infer(text).issues.map(({ code, severity, params, at }) => {
    return [code, severity, params, at && text.slice(at.start, at.end)];
  });

describe('the kind of a formula', () => {
  it.each([
    ['1', 'number'],
    ['p', 'probability'],
    ['1 - p', 'probability'],
    ['p + q - p * q', 'probability'],
    ['1 - u', 'disabilityWeight'],
    ['1 - dw', 'utility'],
    ['1 - ratio', 'ratio'],
    ['r * years', 'number'],
    ['exp(-r * years)', 'number'],
    ['1 - exp(-r * cycle_length)', 'number'],
    ['chance(r, cycle_length)', 'probability'],
    ['hazard(p, 1)', 'rate'],
    ['ratio * r', 'rate'],
    ['ratio * p', 'probability'],
    ['(1 - p) ^ years', 'probability'],
    ['price * visits', 'money'],
    ['c_year * cycle_length', 'money'],
    ['p * c_once', 'costOnce'],
    ['lor * age + lor', 'logOdds'],
    ['ln(ratio) + log_odds(p)', 'logOdds'],
    ['exp(lor)', 'ratio'],
    ['if(time < 2, r, 0)', 'rate'],
    ['max(0, min(1, p))', 'probability'],
    ['clamp(u, 0, 1)', 'utility'],
    ['lookup(deaths, age)', 'rate'],
    ['lookup(plain, age)', 'number'],
    ['start_age', 'time'],
    ['free', 'rate'],
    ['said', 'utility'],
    ['r < p and p == 1', 'number'],
    ['event_by(alive_weibull(time, 1, 2), alive_weibull(time + 1, 1, 2))', 'probability'],
    ['unknown * other', 'number'],
  ])('%s: %s', (text, want) => {
    expect(infer(text).kind.kind).toBe(want);
    expect(issuesOf(text)).toEqual([]);
  });

  it('says what a bare number has scaled', () => {
    expect(infer('c_year / 12').kind).toEqual(inferred('costPerYear', true));
    expect(infer('n * c_year').kind).toEqual(inferred('costPerYear', true));
    expect(infer('ratio * c_year').kind).toEqual(inferred('costPerYear'));
    expect(infer('n - u').kind).toEqual(inferred('utility', true));
  });
});

describe('mixtures that cannot be right', () => {
  it.each([
    ['2 * (p + price)', 'formula.mixedKinds', 'error', 'probability', 'money', 'p + price'],
    ['p - r', 'formula.mixedKinds', 'error', 'probability', 'rate', 'p - r'],
    ['if(n, p, r)', 'formula.mixedKinds', 'error', 'probability', 'rate', 'if(n, p, r)'],
    ['u - dw', 'formula.mixedKinds', 'error', 'utility', 'disabilityWeight', 'u - dw'],
    ['c_year + c_cycle', 'formula.mixedFlows', 'warning', 'costPerYear', 'costPerCycle', undefined],
    [
      'sum(c_once, n, c_year)',
      'formula.mixedFlows',
      'warning',
      'costOnce',
      'costPerYear',
      undefined,
    ],
  ])('%s', (text, code, severity, left, right, cut = text) => {
    expect(issuesOf(text)).toEqual([[code, severity, { left, right }, cut]]);
  });

  it.each([
    ['chance(p, 1)', 'formula.probabilityAsRate', 'rate', 'probability', 'chance', 'rate', 'p'],
    ['hazard(r, 1)', 'formula.rateAsProbability', 'probability', 'rate', 'hazard', 'chance', 'r'],
    ['chance(r, r)', 'formula.kindMismatch', 'time', 'rate', 'chance', 'years', 'r'],
    [
      'times_odds(p, lor)',
      'formula.kindMismatch',
      'ratio',
      'logOdds',
      'times_odds',
      'ratio',
      'lor',
    ],
    [
      '1 + chance_of_log_odds(1 - p)',
      'formula.kindMismatch',
      'logOdds',
      'probability',
      'chance_of_log_odds',
      'x',
      '1 - p',
    ],
  ])('%s', (text, code, wanted, got, fn, argument, cut) => {
    const params = { wanted, got, function: fn, argument };
    expect(issuesOf(text)).toEqual([[code, 'error', params, cut]]);
  });

  it('says each mixture once, and goes on', () => {
    expect(issuesOf('(p + price) * (r + u)')).toHaveLength(2);
  });
});
