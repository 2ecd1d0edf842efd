import { expect, it } from 'vitest';
import { buildScope } from '../../shared/formula/scope.ts';
import { documentWith, parameter, table, variables } from './documents.ts';

const start_age = { id: 'cov_age', symbol: 'start_age', label: 'Age', unit: 'years' };

it('holds every symbol with what it stands for, and the clocks', () => {
  const { scope, issues } = buildScope(
    documentWith({
      parameters: [{ ...parameter('p_die', 'probability'), id: 'par1', unit: 'per year' }],
      variables: variables({ now: '1', later: '2' }, { later: 'rate' }),
      tables: [table('life', 2, 'rate')],
      covariates: [start_age, { id: 'cov_sex', symbol: 'female', label: 'Female' }],
    }),
  );
  expect(issues).toEqual([]);
  expect(scope.names.get('p_die')).toEqual({
    what: 'parameter',
    id: 'par1',
    kind: 'probability',
    unit: 'per year',
    declared: true,
    path: ['parameters', 0, 'symbol'],
  });
  expect(scope.names.get('now')).toMatchObject({ kind: 'number', declared: false });
  expect(scope.names.get('later')).toMatchObject({ kind: 'rate', declared: true });
  expect(scope.names.get('life')).toMatchObject({ what: 'table', keys: 2, kind: 'rate' });
  expect(scope.names.get('female')).toMatchObject({ what: 'covariate', kind: 'number' });
  expect(scope.names.get('start_age')).toMatchObject({ what: 'covariate', kind: 'time' });
  expect(scope.names.get('time_in_state')).toMatchObject({ what: 'clock', kind: 'time' });
  expect(scope.names.get('toString')).toBeUndefined();
  expect(scope.hasStartAge).toBe(true);
});

it('refuses a symbol that is taken, and keeps the first', () => {
  const { scope, issues } = buildScope(
    documentWith({ parameters: [parameter('x', 'rate')], variables: variables({ x: '1' }) }),
  );
  expect(issues).toEqual([
    {
      code: 'names.duplicate',
      severity: 'error',
      path: ['variables', 0, 'symbol'],
      params: { symbol: 'x', what: 'parameter' },
    },
  ]);
  expect(scope.names.get('x')?.what).toBe('parameter');
});

it.each([
  ['time', 'clock'],
  ['and', 'word'],
  ['if', 'word'],
  ['true', 'word'],
  ['chance', 'function'],
  ['lookup', 'function'],
])('reserves %s', (symbol, what) => {
  const { issues } = buildScope(documentWith({ parameters: [parameter(symbol, 'rate')] }));
  expect(issues).toMatchObject([{ code: 'names.reserved', params: { symbol, what } }]);
});

it('leaves the words of operators free', () => {
  const symbols = ['add', 'power', 'equal'].map((symbol) => parameter(symbol, 'number'));
  expect(buildScope(documentWith({ parameters: symbols })).issues).toEqual([]);
});

it('suggests names and functions', () => {
  const { scope } = buildScope(documentWith({ parameters: [parameter('p_relapse', 'rate')] }));
  expect(scope.suggestName('p_realpse')).toBe('p_relapse');
  expect(scope.suggestName('cycle_lenght')).toBe('cycle_length');
  expect(scope.suggestFunction('time_odds')).toBe('times_odds');
  expect(scope.suggestFunction('constructor')).toBeUndefined();
});
