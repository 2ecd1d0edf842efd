import { describe, expect, it } from 'vitest';
import { checkNames, namesIn, placeOf } from '../../shared/formula/names.ts';
import { parseFormula } from '../../shared/formula/parse.ts';
import { buildScope } from '../../shared/formula/scope.ts';
import { documentWith, parameter, table, variables } from './documents.ts';

function exprOf(text: string) {
  const { expr } = parseFormula(text);
  if (!expr) throw new Error(text);
  return expr;
}

const { scope } = buildScope(
  documentWith({
    parameters: [parameter('p_die', 'probability')],
    variables: variables({ now: '1' }),
    tables: [table('life', 1), table('life2', 2)],
  }),
);

const check = (text: string, timeInState = true) =>
  checkNames(exprOf(text), scope, { timeInState }).map(({ code, params, at }) => {
    return [code.replace('formula.', ''), params, at && text.slice(at.start, at.end)];
  });

it('lists names once, tables too, functions not', () => {
  const names = namesIn(exprOf('b + chance(a, b) * lookup(t, a)'));
  expect([...names]).toEqual(['b', 'a', 't']);
});

it('finds where a name is first used', () => {
  expect(placeOf(exprOf('1 + min(a, bb)'), 'bb')).toEqual({ start: 11, end: 13 });
  expect(placeOf(exprOf('min(1, 2)'), 'min')).toBeUndefined();
});

describe('checkNames', () => {
  it('has nothing against known names, clocks, covariates and whole calls', () => {
    const text =
      'if(age > 60 and time_in_state < 2, lookup(life, start_age), lookup(life2, cycle, time)) + now';
    expect(check(text)).toEqual([]);
  });

  it.each([
    ['1 + p_dei', [['unknownName', { name: 'p_dei', suggestion: 'p_die' }, 'p_dei']]],
    ['xyzzy', [['unknownName', { name: 'xyzzy' }, 'xyzzy']]],
    ['chnace(1, 2)', [['unknownFunction', { name: 'chnace', suggestion: 'chance' }, 'chnace']]],
    ['min + 1', [['functionWithoutBrackets', { name: 'min' }, 'min']]],
    ['p_die(1)', [['notAFunction', { name: 'p_die', what: 'parameter' }, 'p_die']]],
    [
      'chance(1)',
      [['wrongArgumentCount', { name: 'chance', got: 1, min: 2, max: 2 }, 'chance(1)']],
    ],
    ['2 * min(1)', [['wrongArgumentCount', { name: 'min', got: 1, min: 2 }, 'min(1)']]],
    ['abs()', [['wrongArgumentCount', { name: 'abs', got: 0, min: 1, max: 1 }, 'abs()']]],
    ['life * 2', [['tableWithoutLookup', { name: 'life' }, 'life']]],
    ['lookup(p_die, 1)', [['lookupNeedsTable', {}, 'p_die']]],
    ['lookup(1 + 2, 1)', [['lookupNeedsTable', {}, '1 + 2']]],
    ['lookup(lief, 1)', [['unknownName', { name: 'lief', suggestion: 'life' }, 'lief']]],
    [
      'lookup(life)',
      [['wrongArgumentCount', { name: 'lookup', got: 1, min: 2, max: 3 }, 'lookup(life)']],
    ],
    [
      'lookup(life, 1, 2)',
      [['wrongKeyCount', { table: 'id_life', got: 2, wanted: 1 }, 'lookup(life, 1, 2)']],
    ],
    [
      'lookup(life2, 1)',
      [['wrongKeyCount', { table: 'id_life2', got: 1, wanted: 2 }, 'lookup(life2, 1)']],
    ],
    ['lookup(life, life)', [['tableWithoutLookup', { name: 'life' }, 'life']]],
    [
      'a1 + chance(b1)',
      [
        ['unknownName', { name: 'a1' }, 'a1'],
        ['wrongArgumentCount', { name: 'chance', got: 1, min: 2, max: 2 }, 'chance(b1)'],
        ['unknownName', { name: 'b1' }, 'b1'],
      ],
    ],
    [
      '__proto__ + constructor(1)',
      [
        ['unknownName', { name: '__proto__' }, '__proto__'],
        ['unknownFunction', { name: 'constructor' }, 'constructor'],
      ],
    ],
  ])('%s', (text, want) => expect(check(text)).toEqual(want));

  it('knows where time_in_state has no meaning', () => {
    expect(check('1 + time_in_state', false)).toEqual([['noTimeInState', {}, 'time_in_state']]);
  });

  it('asks for a start age before age', () => {
    const without = buildScope(documentWith({ covariates: [] })).scope;
    expect(checkNames(exprOf('age'), without)).toMatchObject([{ code: 'formula.noStartAge' }]);
  });

  it('stops at 20', () => {
    const text = Array.from({ length: 50 }, (_, i) => `zz${i}`).join(' + ');
    expect(check(text)).toHaveLength(20);
  });
});
