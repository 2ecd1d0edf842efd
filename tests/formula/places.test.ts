import { describe, expect, it } from 'vitest';
import { inferKind } from '../../shared/formula/kinds.ts';
import { parseFormula } from '../../shared/formula/parse.ts';
import {
  cellPlace,
  checkPlace,
  constantValue,
  type Place,
  payoffPlace,
  type Setting,
} from '../../shared/formula/places.ts';
import { buildScope } from '../../shared/formula/scope.ts';
import type { Payoff } from '../../shared/model/document.ts';
import type { Kind } from '../../shared/model/kinds.ts';
import { documentWith, EVERY_KIND } from './documents.ts';

const { scope } = buildScope(documentWith({ parameters: EVERY_KIND, variables: [] }));
const monthly: Setting = { measure: 'qaly', cycleLength: 1 / 12 };
const yearly: Setting = { measure: 'qaly', cycleLength: 1 };

function exprOf(text: string) {
  const { expr } = parseFormula(text);
  if (!expr) throw new Error(text);
  return expr;
}

function check(text: string, place: Place, setting: Setting) {
  const expr = exprOf(text);
  const issues = checkPlace(expr, inferKind(expr, scope).kind, place, setting);
  return issues.map(({ code, severity }) => `${severity} ${code.replace('formula.', '')}`);
}

const kind = (wanted: Kind): Place => ({ type: 'kind', kind: wanted });
const outcome = (per: 'year' | 'cycle' | 'once'): Place => ({ type: 'outcome', per });

describe('cells, shares and curves', () => {
  it.each<[string, Kind, string[]]>([
    ['p', 'probability', []],
    ['n', 'probability', []],
    ['p * ratio', 'probability', []],
    ['1 - exp(-r * cycle_length)', 'probability', []],
    ['r', 'probability', ['error rateAsProbability']],
    ['r / 12', 'probability', ['warning rateAsProbability']],
    ['r', 'rate', []],
    ['p', 'rate', ['error probabilityAsRate']],
    ['hazard(p, 1)', 'rate', []],
    ['lor + lor * age', 'logOdds', []],
    ['p', 'logOdds', ['error kindMismatch']],
    ['ratio', 'logOdds', ['warning kindMismatch']],
    ['price', 'probability', ['error kindMismatch']],
  ])('%s as %s', (text, wanted, want) => expect(check(text, kind(wanted), monthly)).toEqual(want));

  it('wants of a cell what its row is based on', () => {
    expect(cellPlace).toEqual({
      probabilities: kind('probability'),
      rates: kind('rate'),
      logit: kind('logOdds'),
    });
  });
});

describe('costs', () => {
  it.each<[string, Kind, string[]]>([
    ['c_year', 'costPerYear', []],
    ['c_year', 'costPerCycle', ['warning yearlyCostPerCycle']],
    ['c_year * cycle_length', 'costPerCycle', []],
    ['c_year / 12', 'costPerCycle', []],
    ['c_cycle', 'costPerCycle', []],
    ['c_cycle', 'costPerYear', ['warning cycleCostPerYear']],
    ['price * visits', 'costPerYear', []],
    ['c_once', 'costPerYear', ['warning kindMismatch']],
    ['c_year', 'costOnce', ['warning kindMismatch']],
    ['u', 'costPerYear', ['error kindMismatch']],
    ['p * c_once + price', 'costOnce', []],
  ])('%s as %s', (text, wanted, want) => expect(check(text, kind(wanted), monthly)).toEqual(want));

  it('are a cycle’s and a year’s alike in a yearly model', () => {
    expect(check('c_year', kind('costPerCycle'), yearly)).toEqual([]);
    expect(check('c_cycle', kind('costPerYear'), yearly)).toEqual([]);
    expect(check('c_once', kind('costPerYear'), yearly)).toEqual(['warning kindMismatch']);
  });
});

describe('outcomes', () => {
  const daly: Setting = { measure: 'daly', cycleLength: 1 / 12 };
  const natural: Setting = { measure: 'natural', cycleLength: 1 / 12 };
  it.each<[string, 'year' | 'cycle' | 'once', Setting, string[]]>([
    ['u', 'year', monthly, []],
    ['u * u', 'year', monthly, []],
    ['u - 0.1', 'year', monthly, []],
    ['u * cycle_length', 'cycle', monthly, []],
    ['u', 'cycle', monthly, ['warning yearlyWeightPerCycle']],
    ['u', 'cycle', yearly, []],
    ['1 - dw', 'year', monthly, []],
    ['dw', 'year', monthly, ['error disabilityAsUtility']],
    ['dw', 'year', daly, []],
    ['u', 'year', daly, ['error utilityAsDisability']],
    ['years', 'once', daly, []],
    ['c_year', 'year', monthly, ['error notAnOutcome']],
    ['price', 'once', natural, ['error notAnOutcome']],
    ['visits', 'cycle', natural, []],
    ['dw', 'year', natural, []],
  ])('%s per %s', (text, per, setting, want) => {
    expect(check(text, outcome(per), setting)).toEqual(want);
  });
});

describe('constants', () => {
  it.each<[string, Place, string[]]>([
    ['1.2', outcome('year'), ['error constantOutsideRange']],
    ['if(age > 60, 1.2, 0.8)', outcome('year'), ['error constantOutsideRange']],
    ['0.8', outcome('year'), []],
    ['-0.2', outcome('year'), []],
    ['1.2', outcome('once'), []],
    ['1.5 - 0.2', kind('probability'), ['error constantOutsideRange']],
    ['-0.1', kind('rate'), ['error constantOutsideRange']],
    ['3', kind('rate'), []],
    ['-50', kind('costPerYear'), []],
  ])('%s', (text, place, want) => expect(check(text, place, monthly)).toEqual(want));

  it('are reported with the range and the place of the branch', () => {
    const text = 'if(age > 60, 0.1, 1 + 1)';
    const expr = exprOf(text);
    expect(checkPlace(expr, inferKind(expr, scope).kind, kind('probability'), monthly)).toEqual([
      {
        code: 'formula.constantOutsideRange',
        severity: 'error',
        path: [],
        params: { kind: 'probability', value: 2, low: 0, high: 1 },
        at: { start: 18, end: 23 },
      },
    ]);
  });

  it('are worked out from numbers alone', () => {
    expect(constantValue(exprOf('2 * (3 + max(1, 4)) ^ 2'))).toBe(98);
    expect(constantValue(exprOf('chance(0, 1) + true'))).toBe(1);
    expect(constantValue(exprOf('2 * n'))).toBeUndefined();
    for (const text of ['toString(1)', 'chance(1)', 'sum()', 'lookup(1, 2)']) {
      expect(constantValue(exprOf(text))).toBeUndefined();
    }
  });
});

it('takes the place of a payoff from its measure and its time', () => {
  const base = { id: 'x', label: 'x', category: 'x', formula: '1', amounts: [] };
  const place = (part: Partial<Payoff>) => payoffPlace({ ...base, ...part } as Payoff);
  expect(place({ type: 'state', measure: 'cost', per: 'year' })).toEqual(kind('costPerYear'));
  expect(place({ type: 'state', measure: 'cost', per: 'cycle' })).toEqual(kind('costPerCycle'));
  expect(place({ type: 'movement', measure: 'cost' })).toEqual(kind('costOnce'));
  expect(place({ type: 'start', measure: 'outcome' })).toEqual(outcome('once'));
  expect(place({ type: 'state', measure: 'outcome', per: 'cycle' })).toEqual(outcome('cycle'));
});
