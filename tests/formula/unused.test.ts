import { expect, it } from 'vitest';
import { checkUnused } from '../../shared/formula/unused.ts';
import { documentWith, parameter, table, variables } from './documents.ts';

const unused = (document: ReturnType<typeof documentWith>, ...used: string[]) =>
  checkUnused(document, new Set(used)).map(({ code, severity, path, params }) => {
    expect([code, severity]).toEqual(['formula.unused', 'warning']);
    return [path.join('.'), params.what, params.symbol];
  });

it('names parameters, variables and tables that nothing uses', () => {
  const document = documentWith({
    parameters: [parameter('a', 'rate'), parameter('b', 'rate')],
    variables: variables({ v: 'a', w: 'v' }),
    tables: [table('t')],
  });
  expect(unused(document, 'a', 'v')).toEqual([
    ['parameters.1.symbol', 'parameter', 'b'],
    ['variables.1.symbol', 'variable', 'w'],
    ['tables.0.symbol', 'table', 't'],
  ]);
});

it('spares the rest of a Dirichlet row of which a member is used', () => {
  const document = documentWith({
    parameters: ['a', 'b', 'c', 'd'].map((symbol) => parameter(symbol, 'probability')),
    variables: [],
    groups: [
      { id: 'g', label: 'g', type: 'dirichlet', members: ['a', 'b'], counts: [1, 1] },
      { id: 'h', label: 'h', type: 'dirichlet', members: ['c', 'd'], counts: [1, 1] },
    ],
  });
  expect(unused(document, 'a').map(([, , symbol]) => symbol)).toEqual(['c', 'd']);
});
