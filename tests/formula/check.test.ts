import { describe, expect, it } from 'vitest';
import { checkFormulas } from '../../shared/formula/check.ts';
import type { ModelDocument } from '../../shared/model/document.ts';
import { documentWith, parameter, variables } from './documents.ts';

const tiny = documentWith({});

/** The tiny document with its own parameters and variables, and more. */
const plus = (part: Partial<ModelDocument>) =>
  documentWith({
    ...part,
    parameters: [...tiny.parameters, ...(part.parameters ?? [])],
    variables: [...tiny.variables, ...(part.variables ?? [])],
  });

const briefly = (document: ModelDocument) =>
  checkFormulas(document).map(({ code, path, at }) => {
    return [code, path.join('.'), ...(at ? [`${at.start}-${at.end}`] : [])];
  });

const cellOf = (formula: string): ModelDocument['movements'] => ({
  type: 'rows',
  rows: [
    {
      id: 'from_alive',
      from: 'alive',
      basis: 'probabilities',
      remainder: 'alive',
      cells: [{ id: 'c', to: 'dead', formula }],
    },
  ],
});

it('has nothing against a sound document', () => {
  expect(checkFormulas(tiny)).toEqual([]);
});

it('gives the whole path to the text, by strategy too, and the place within', () => {
  const document = documentWith({
    variables: [
      ...variables({ die_now: { byStrategy: { treatment: 'p_die *' }, otherwise: 'p_dei' } }),
    ],
  });
  const issues = checkFormulas(document);
  expect(issues).toContainEqual({
    code: 'formula.incomplete',
    severity: 'error',
    path: ['variables', 0, 'formula', 'byStrategy', 'treatment'],
    params: { after: '*' },
    at: { start: 6, end: 7 },
  });
  expect(issues).toContainEqual({
    code: 'formula.unknownName',
    severity: 'error',
    path: ['variables', 0, 'formula', 'otherwise'],
    params: { name: 'p_dei', suggestion: 'p_die' },
    at: { start: 0, end: 5 },
  });
});

it('checks kinds where a formula stands, through variables that declare none', () => {
  const document = plus({
    parameters: [parameter('rate_die', 'rate')],
    variables: variables({ twice: 'raised * rr_die', raised: 'rate_die * rr_die' }),
    movements: cellOf('die_now + 0 * twice'),
  });
  expect(briefly(document)).toEqual([]);
  const wrong = { ...document, movements: cellOf('twice') };
  expect(briefly(wrong)).toEqual([
    ['formula.rateAsProbability', 'movements.rows.0.cells.0.formula', '0-5'],
    ['formula.unused', 'variables.0.symbol'],
  ]);
});

it('holds a variable to the kind that it declares', () => {
  const document = plus({ variables: variables({ v: 'rr_die * c_year' }, { v: 'probability' }) });
  expect(briefly(document)).toContainEqual(['formula.kindMismatch', 'variables.1.formula', '0-15']);
});

it('reports circles once for all strategies, and those that a scenario closes', () => {
  const document = plus({ variables: variables({ a: 'b + 0 * die_now', b: 'a' }) });
  const circle = ['formula.cycle', 'variables.1.formula', '0-1'];
  expect(briefly(document)).toEqual([circle]);
  const scenario = plus({
    variables: variables({ a: 'b', b: '1' }),
    scenarios: [
      {
        id: 's',
        label: 's',
        overrides: [{ type: 'variable', variable: 'b', formula: 'a * 2' }],
      },
    ],
  });
  expect(briefly(scenario)).toContainEqual(['formula.cycle', 'variables.1.formula', '0-1']);
});

it('checks scenario formulas as the variables they stand for', () => {
  const document = plus({
    scenarios: [
      {
        id: 's',
        label: 's',
        overrides: [
          { type: 'variable', variable: 'v_die', formula: 'c_year + oops' },
          { type: 'parameter', parameter: 'p_die', value: 2 },
        ],
      },
    ],
  });
  expect(briefly(document)).toEqual([
    ['formula.unknownName', 'scenarios.0.overrides.0.formula', '9-13'],
    ['formula.kindMismatch', 'scenarios.0.overrides.0.formula', '0-13'],
    ['values.outsideKind', 'scenarios.0.overrides.1.value'],
  ]);
});

describe('time in state', () => {
  const timed: ModelDocument['states'] = [
    { id: 'alive', label: 'Alive', type: 'timed', cycles: 3, dead: false },
    { id: 'dead', label: 'Dead', type: 'absorbing', dead: true },
  ];
  const part = {
    variables: variables({ later: 'if(time_in_state > 1, p_die, die_now)' }),
    movements: cellOf('later'),
  };

  it('has a meaning in a timed state, through variables too', () => {
    expect(briefly(plus({ ...part, states: timed }))).toEqual([]);
  });

  it('has none elsewhere', () => {
    expect(checkFormulas(plus(part))).toEqual([
      {
        code: 'formula.noTimeInState',
        severity: 'error',
        path: ['movements', 'rows', 0, 'cells', 0, 'formula'],
        params: { variable: 'later' },
        at: { start: 0, end: 5 },
      },
    ]);
    expect(briefly(plus({ movements: cellOf('die_now * time_in_state') }))).toContainEqual([
      'formula.noTimeInState',
      'movements.rows.0.cells.0.formula',
      '10-23',
    ]);
  });

  it('is asked for only by the strategies that use it', () => {
    const later = { byStrategy: { treatment: 'time_in_state' }, otherwise: 'die_now' };
    const row = cellOf('later');
    if (row.type !== 'rows') throw new Error('rows');
    const rowsFor = (strategies: string[]): ModelDocument['movements'] => ({
      ...row,
      rows: row.rows.map((one) => ({ ...one, strategies })),
    });
    const codes = (strategies: string[]) =>
      briefly(plus({ variables: variables({ later }), movements: rowsFor(strategies) })).map(
        ([code]) => code,
      );
    expect(codes(['usual'])).toEqual([]);
    expect(codes(['treatment'])).toContain('formula.noTimeInState');
  });
});

it('flags what is never used', () => {
  const document = plus({ parameters: [parameter('spare', 'rate')] });
  expect(checkFormulas(document)).toEqual([
    {
      code: 'formula.unused',
      severity: 'warning',
      path: ['parameters', 4, 'symbol'],
      params: { what: 'parameter', symbol: 'spare' },
    },
  ]);
});

describe('documents past all measure', () => {
  const many = (count: number, formula: (i: number) => string) =>
    variables(Object.fromEntries(Array.from({ length: count }, (_, i) => [`v${i}`, formula(i)])));

  it('lists a thousand issues at most, errors first', () => {
    const issues = checkFormulas(documentWith({ variables: many(1_500, () => 'nobody') }));
    expect(issues).toHaveLength(1_000);
    expect(issues.every(({ severity }) => severity === 'error')).toBe(true);
  });

  it('refuses more than a million characters of formulas', () => {
    const long = `1${' '.repeat(3_999)}`;
    expect(checkFormulas(documentWith({ variables: many(251, () => long) }))).toMatchObject([
      { code: 'formula.tooMuchText', params: { limit: 1_000_000 } },
    ]);
  });

  it('gives up the search for circles after ten million steps', () => {
    const dense = (i: number) => `sum(${Array.from({ length: i }, (_, k) => `v${k}`).join(',')},1)`;
    const overrides = [{ type: 'variable' as const, variable: 'v0', formula: '2' }];
    const scenarios = Array.from({ length: 150 }, (_, i) => ({
      id: `s${i}`,
      label: 's',
      overrides,
    }));
    const issues = checkFormulas(documentWith({ variables: many(600, dense), scenarios }));
    expect(issues[0]).toMatchObject({ code: 'formula.tooMuchWork', severity: 'error' });
  });
});
