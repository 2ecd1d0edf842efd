import { describe, expect, it } from 'vitest';
import { checkValues, rangeOf } from '../../shared/formula/ranges.ts';
import type { Distribution } from '../../shared/model/document.ts';
import type { Kind } from '../../shared/model/kinds.ts';
import { documentWith, parameter, table } from './documents.ts';

it('knows the ranges of kinds', () => {
  expect(rangeOf('probability')).toEqual({ low: 0, high: 1 });
  expect(rangeOf('utility')).toEqual({ low: Number.NEGATIVE_INFINITY, high: 1 });
  expect(rangeOf('rate')).toEqual({ low: 0, high: Number.POSITIVE_INFINITY });
});

describe('values', () => {
  it.each<[Kind, number, object | undefined]>([
    ['probability', 1.1, { low: 0, high: 1 }],
    ['probability', 1, undefined],
    ['utility', 1.01, { high: 1 }],
    ['utility', -0.3, undefined],
    ['disabilityWeight', -0.1, { low: 0, high: 1 }],
    ['rate', -0.1, { low: 0 }],
    ['costPerYear', -5, undefined],
  ])('%s of %d', (kind, value, bounds) => {
    const issues = checkValues(documentWith({ parameters: [parameter('x', kind, value)] }));
    const params = { kind, value, ...bounds };
    const path = ['parameters', 0, 'value'];
    expect(issues).toEqual(
      bounds ? [{ code: 'values.outsideKind', severity: 'error', path, params }] : [],
    );
  });

  it('of tables are reported at the first, those of scenarios each', () => {
    const issues = checkValues(
      documentWith({
        parameters: [parameter('p', 'probability')],
        tables: [{ ...table('t', 1, 'rate'), values: [0.1, -1] }, table('plain')],
        scenarios: [
          {
            id: 's',
            label: 's',
            overrides: [{ type: 'parameter', parameter: 'p', value: 7 }],
          },
        ],
      }),
    );
    expect(issues.map(({ code, path }) => [code, path])).toEqual([
      ['values.outsideKind', ['tables', 0, 'values', 1]],
      ['values.outsideKind', ['scenarios', 0, 'overrides', 0, 'value']],
    ]);
  });
});

describe('distributions', () => {
  it.each<[Kind, Distribution, boolean]>([
    ['probability', { type: 'beta', alpha: 2, beta: 8 }, false],
    ['probability', { type: 'normal', mean: 0.1, sd: 0.01 }, false],
    ['probability', { type: 'normal', mean: 0.1, sd: 0.05 }, true],
    ['utility', { type: 'normal', mean: 0.95, sd: 0.05 }, true],
    ['probability', { type: 'lognormal', meanlog: -4, sdlog: 0.5 }, false],
    ['probability', { type: 'lognormal', meanlog: -1, sdlog: 0.5 }, true],
    ['disabilityWeight', { type: 'gamma', shape: 4, scale: 0.3 }, true],
    ['rate', { type: 'uniform', low: -1, high: 2 }, true],
    ['probability', { type: 'pert', low: 0, mode: 0.2, high: 1.5, weight: 4 }, true],
    ['costPerYear', { type: 'normal', mean: 0, sd: 100 }, false],
    ['rate', { type: 'empirical', values: [0.1] }, false],
  ])('%s drawn from %j: %s', (kind, distribution, want) => {
    const parameters = [{ ...parameter('x', kind, 0.5), distribution }];
    const issues = checkValues(documentWith({ parameters }));
    expect(issues.map(({ code, severity }) => [code, severity])).toEqual(
      want ? [['values.drawsOutsideKind', 'warning']] : [],
    );
  });
});
