import { describe, expect, it } from 'vitest';
import { diagramLayout } from '../../../../../src/routes/appraisal/model/diagram-layout.ts';
import { movesOf } from '../../../../../src/routes/appraisal/model/moves.ts';
import { tinyDocument } from '../../../../fixtures/tiny-document.ts';

const state = (id: string, dead = false) => {
  return { id, label: id, type: dead ? 'absorbing' : 'ordinary', dead } as const;
};
const STATES = [state('well'), state('ill'), state('worse'), state('dead', true)];
const MOVES = [
  ['well', 'ill'],
  ['ill', 'well'],
  ['ill', 'worse'],
  ['well', 'dead'],
].map(([from = '', to = '']) => ({ from, to, formulas: [] }));

describe('diagramLayout', () => {
  const layout = diagramLayout(STATES, MOVES, ['well'], 400);
  const at = (id: string) => layout.boxes.find((box) => box.id === id) ?? { x: NaN, y: NaN };

  it('puts states below those that lead to them, the dead to the right', () => {
    expect(at('well').y).toBeLessThan(at('ill').y);
    expect(at('ill').y).toBeLessThan(at('worse').y);
    expect(at('dead').x).toBeGreaterThan(at('well').x + layout.boxWidth);
  });

  it('keeps every box within the width, and boxes apart', () => {
    for (const { x } of layout.boxes) {
      expect(x - layout.boxWidth / 2).toBeGreaterThanOrEqual(0);
      expect(x + layout.boxWidth / 2).toBeLessThanOrEqual(400);
    }
    expect(new Set(layout.boxes.map(({ x, y }) => `${x} ${y}`)).size).toBe(4);
  });

  it('draws there and back apart', () => {
    expect(new Set(layout.arrows.map(({ path }) => path)).size).toBe(MOVES.length);
  });
});

describe('movesOf', () => {
  it('gives who can go where, with formulas, and leaves out who stays', () => {
    expect(movesOf(tinyDocument(), 'treatment')).toEqual([
      { from: 'alive', to: 'dead', formulas: ['die_now'] },
    ]);
  });

  it('passes through survival curves in their order', () => {
    const curves = [{ id: 'c', state: 'alive', formula: '1' }];
    const document = tinyDocument({ movements: { type: 'survival', curves, last: 'dead' } });
    expect(movesOf(document, null)).toEqual([{ from: 'alive', to: 'dead', formulas: [] }]);
  });
});
