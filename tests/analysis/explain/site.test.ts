import { describe, expect, it } from 'vitest';
import { moveSite, siteOf } from '../../../shared/analysis/explain/site.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';

describe('siteOf', () => {
  it("gives a strategy's own text with its place, or none", () => {
    const formula = { byStrategy: { a: '1' }, otherwise: '2' };
    expect(siteOf('3', ['x'], 'a')).toEqual({ path: ['x'], text: '3' });
    expect(siteOf(formula, ['x'], 'a')).toEqual({ path: ['x', 'byStrategy', 'a'], text: '1' });
    expect(siteOf(formula, ['x'], 'b')).toEqual({ path: ['x', 'otherwise'], text: '2' });
    expect(siteOf({ byStrategy: {} }, ['x'], 'a')).toBeNull();
  });
});

describe('moveSite', () => {
  it('finds the row that holds for the strategy', () => {
    const tiny = tinyDocument();
    if (tiny.movements.type !== 'rows') throw new RangeError(tiny.movements.type);
    const [row] = tiny.movements.rows;
    const rows = [
      { ...row!, strategies: ['usual'] },
      {
        ...row!,
        id: 'other',
        strategies: ['treatment'],
        cells: [{ id: 'c', to: 'dead', formula: '0.5' }],
      },
    ];
    const document = tinyDocument({ movements: { type: 'rows', rows } });
    const path = ['movements', 'rows', 1, 'cells', 0, 'formula'];
    expect(moveSite(document, 'treatment', 'alive', 'dead')).toEqual({ path, text: '0.5' });
    expect(moveSite(document, 'usual', 'alive', 'dead')?.text).toBe('die_now');
    expect(moveSite(document, 'usual', 'alive', 'alive')).toBeNull();
    expect(moveSite(document, 'usual', 'dead', 'dead')).toBeNull();
  });
});
