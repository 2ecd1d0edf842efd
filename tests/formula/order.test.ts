import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { definitionsIn } from '../../shared/formula/definitions.ts';
import { orderForAll, orderVariables } from '../../shared/formula/order.ts';
import { documentWith, type VariableList, variables } from './documents.ts';

type Formulas = Record<string, VariableList[number]['formula']>;

const definitions = (formulas: Formulas) =>
  definitionsIn(documentWith({ variables: variables(formulas) }));

const order = (formulas: Formulas, strategy = 'usual') => {
  const ordered = orderVariables(definitions(formulas), strategy);
  return { symbols: ordered.order.map(({ symbol }) => symbol), issues: ordered.issues };
};

describe('orderVariables', () => {
  it('puts each variable after those it uses', () => {
    const { symbols, issues } = order({ a: 'c + b', b: 'c * 2', c: '1', d: 'unknown + a' });
    expect(symbols).toEqual(['c', 'b', 'a', 'd']);
    expect(issues).toEqual([]);
  });

  it('reports a circle at its first definition, with the name that leads on', () => {
    expect(order({ a: '1 + b', b: 'cc', cc: 'max(2, a)' }).issues).toEqual([
      {
        code: 'formula.cycle',
        severity: 'error',
        path: ['variables', 0, 'formula'],
        params: { cycle: 'a → b → cc → a', length: 3 },
        at: { start: 4, end: 5 },
      },
    ]);
  });

  it('reports a variable that uses itself, and circles apart from one another', () => {
    const { issues } = order({ a: 'a', x: 'y', y: 'x', z: 'a + x' });
    expect(issues.map(({ params }) => params.cycle)).toEqual(['a → a', 'x → y → x']);
  });

  it('reads the formula of the strategy', () => {
    const formulas = { a: { byStrategy: { treatment: 'b' }, otherwise: '1' }, b: 'a' };
    expect(order(formulas).issues).toEqual([]);
    expect(order(formulas).symbols).toEqual(['a', 'b']);
    expect(order(formulas, 'treatment').issues).toMatchObject([
      { path: ['variables', 0, 'formula', 'byStrategy', 'treatment'] },
    ]);
  });

  it('follows a chain of any length, and writes out the start of a long circle', () => {
    const chain = Object.fromEntries(
      Array.from({ length: 2_000 }, (_, i) => [`v${i}`, `v${(i + 1) % 2_000}`]),
    );
    const [issue] = order(chain).issues;
    expect(issue?.params.length).toBe(2_000);
    expect(String(issue?.params.cycle)).toMatch(/^v0 → v1 → .* → …$/);
    const open = order({ ...chain, v1999: '1' });
    expect(open.issues).toEqual([]);
    expect(open.symbols[0]).toBe('v1999');
  });

  it('takes a formula that does not parse as using nothing', () => {
    expect(order({ a: 'b +', b: 'a' }).issues).toEqual([]);
  });

  it('orders any graph without circles, whatever the order of the document', () => {
    const edges = fc.array(fc.tuple(fc.nat(19), fc.nat(19)), { maxLength: 60 });
    const shuffled = fc.shuffledSubarray([...Array(20).keys()], { minLength: 20 });
    fc.assert(
      fc.property(edges, shuffled, (pairs, places) => {
        const uses = (i: number) => pairs.filter(([from, to]) => from === i && to < i);
        const formula = (i: number) => ['0', ...uses(i).map(([, to]) => `v${to}`)].join(' + ');
        const formulas = Object.fromEntries(places.map((i) => [`v${i}`, formula(i)]));
        const { symbols, issues } = order(formulas);
        expect(issues).toEqual([]);
        expect(symbols).toHaveLength(20);
        for (let i = 0; i < 20; i += 1) {
          for (const [, to] of uses(i)) {
            expect(symbols.indexOf(`v${to}`)).toBeLessThan(symbols.indexOf(`v${i}`));
          }
        }
      }),
      { numRuns: 50 },
    );
  });
});

describe('orderForAll', () => {
  it('follows the formulas of every strategy', () => {
    const { order: all, isCircular } = orderForAll(
      definitions({ a: { byStrategy: { treatment: 'b' }, otherwise: 'c' }, b: '1', c: 'b' }),
    );
    expect(all.map(({ symbol }) => symbol)).toEqual(['b', 'c', 'a']);
    expect(isCircular).toBe(false);
  });

  it('stops when its budget is spent', () => {
    const budget = { left: 2 };
    orderForAll(definitions({ a: '1', b: '1', c: '1', d: '1', e: '1' }), budget);
    expect(budget.left).toBe(-1);
  });
});
