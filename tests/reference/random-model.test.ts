/**
 * The random models are worth comparing simulators on: the same seed gives the same
 * document, every part of the model appears, and nothing in them is out of range.
 */
import { describe, expect, it } from 'vitest';
import type { ModelDocument } from '../../shared/model/document.ts';
import { randomModel } from './random-model.ts';
import { baseValues, simulate } from './simulate.ts';

const models = Array.from({ length: 300 }, (_, i) => randomModel(i + 1));

const rowsOf = ({ movements }: ModelDocument) => (movements.type === 'rows' ? movements.rows : []);

const basesOf = (model: ModelDocument): string[] => [
  ...new Set(rowsOf(model).map((row) => (row.basis === 'rates' ? row.method : row.basis))),
];

/** What must turn up, in at least five of the models. */
const WANTED: Record<string, (model: ModelDocument) => boolean> = {
  'probability rows': (m) => basesOf(m).includes('probabilities'),
  'logit rows': (m) => basesOf(m).includes('logit'),
  'rates by row': (m) => basesOf(m).includes('byRow'),
  'rates by generator': (m) => basesOf(m).includes('generator'),
  'three bases or more in one model': (m) => basesOf(m).length >= 3,
  'survival curves': (m) => m.movements.type === 'survival',
  'a generator over timed states': (m) =>
    rowsOf(m).some(
      (row) =>
        row.basis === 'rates' &&
        row.method === 'generator' &&
        m.states.some(
          ({ id, type, cycles }) => id === row.from && type === 'timed' && cycles !== 1,
        ),
    ),
  'rows by strategy': (m) => rowsOf(m).some(({ strategies }) => strategies),
  'cells into the own state': (m) =>
    rowsOf(m).some(({ from, cells }) => cells.some(({ to }) => to === from)),
  'starts in a timed state': (m) =>
    m.states.some(({ id, type }) => id === m.start.remainder && type === 'timed'),
  'no dead state': (m) => !m.states.some(({ dead }) => dead),
  'eight states': (m) => m.states.length === 8,
  'five strategies': (m) => m.strategies.length === 5,
  'four profiles': (m) => m.profiles.length === 4,
  'time in state': (m) => JSON.stringify(m).includes('time_in_state'),
  'variables of variables': (m) =>
    m.variables.some(({ formula }) => /_of_\d/.test(JSON.stringify(formula))),
  'tables by two keys': (m) => m.tables.some(({ keys }) => keys.length === 2),
  'linear tables': (m) => m.tables.some(({ interpolation }) => interpolation === 'linear'),
  'a horizon of no whole number of cycles': ({ question: q }) =>
    Math.abs(q.horizon / q.cycleLength - Math.round(q.horizon / q.cycleLength)) > 0.2,
  'whole years': (m) => m.question.discounting.wholeYears,
  'rates by year': (m) => typeof m.question.discounting.costs !== 'number',
  'predictors that would overflow': (m) => JSON.stringify(m.movements).includes('"800 + '),
  ...Object.fromEntries(
    ['dirichlet', 'multivariateNormal', 'rankCorrelation', 'jointRows'].map((type) => [
      `group ${type}`,
      (m: ModelDocument) => m.groups.some((group) => group.type === type),
    ]),
  ),
  ...Object.fromEntries(
    ['state', 'movement', 'once', 'start'].map((type) => [
      `payoffs ${type}`,
      (m: ModelDocument) => m.payoffs.some((payoff) => payoff.type === type),
    ]),
  ),
  ...Object.fromEntries(
    ['start', 'end', 'trapezoid', 'simpson'].flatMap((counting) =>
      ['counted', 'cycleStart', 'cycleMiddle', 'cycleEnd'].map((at) => [
        `counting ${counting}, discounted at ${at}`,
        ({ question }: ModelDocument) =>
          question.counting === counting && question.discounting.at === at,
      ]),
    ),
  ),
  ...Object.fromEntries(
    [1, 1 / 2, 1 / 12, 7 / 365.25].map((years) => [
      `cycles of ${years} years`,
      ({ question }: ModelDocument) => question.cycleLength === years,
    ]),
  ),
};

describe('random models', () => {
  it('come again from the same seed', () => {
    expect(randomModel(17)).toEqual(models[16]);
    expect(randomModel(18)).not.toEqual(models[16]);
  });

  it.each(Object.keys(WANTED))('hold %s', (name) => {
    expect(models.filter((model) => WANTED[name]?.(model)).length).toBeGreaterThanOrEqual(5);
  });

  it('keep the cohort whole, within [0, 1]', () => {
    models.slice(0, 60).forEach((model, i) => {
      for (const { trace, cost, outcome } of simulate(model, baseValues(model))) {
        expect(Number.isFinite(cost + outcome), `seed ${i + 1}`).toBe(true);
        for (const shares of trace) {
          expect(Math.min(...shares), `seed ${i + 1}`).toBeGreaterThanOrEqual(-1e-15);
          expect(
            shares.reduce((a, b) => a + b, 0),
            `seed ${i + 1}`,
          ).toBeCloseTo(1, 12);
        }
      }
    });
  });
});
