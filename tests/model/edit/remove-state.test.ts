import { describe, expect, test } from 'vitest';
import { prepare } from '../../../shared/engine/engine.ts';
import type { ModelDocument, Row } from '../../../shared/model/document.ts';
import { removeState } from '../../../shared/model/edit/remove-state.ts';
import { exampleOf } from '../../examples/load.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';
import { soundAfter } from './after.ts';

function without(document: ModelDocument, id: string): ModelDocument {
  return soundAfter(document, removeState(document, id)!);
}

describe('under log odds', () => {
  const states = ['alive', 'ill', 'dead'].map((id) => {
    const type = id === 'dead' ? ('absorbing' as const) : ('ordinary' as const);
    return { id, label: id, type, dead: id === 'dead' };
  });
  const cells = [
    { id: 'stay', to: 'alive', formula: 'ln(6)' },
    { id: 'ill', to: 'ill', formula: 'ln(3)' },
  ];
  const row: Row = { id: 'r', from: 'alive', basis: 'logit', reference: 'dead', cells };
  const ill: Row = { id: 'i', from: 'ill', basis: 'probabilities', remainder: 'ill', cells: [] };
  const document = tinyDocument({
    states,
    movements: { type: 'rows', rows: [row, ill] },
    parameters: tinyDocument().parameters.filter(({ id }) => ['c_year', 'u_alive'].includes(id)),
    variables: [],
  });

  test('without the reference, the others keep their odds', () => {
    const left = without(document, 'dead');
    expect(left.movements).toMatchObject({
      rows: [{ reference: 'alive', cells: [{ to: 'ill', formula: '(ln(3)) - (ln(6))' }] }, {}],
    });
    // Odds of 6 to 3: a third of the living falls ill each year.
    const cells = [{ id: 'ill', to: 'ill', formula: '1 / 3' }];
    const third: Row = {
      id: 'r',
      from: 'alive',
      basis: 'probabilities',
      remainder: 'alive',
      cells,
    };
    const plain: ModelDocument = { ...left, movements: { type: 'rows', rows: [third, ill] } };
    const outcome = (each: ModelDocument) => prepare(each).base().strategies[0]!.outcome;
    expect(outcome(left)).toBeCloseTo(outcome(plain), 12);
  });

  test('where no staying was meant, another destination is the reference', () => {
    const moved: Row = { ...row, cells: [cells[1]!] };
    const rows = tinyDocument({ ...document, movements: { type: 'rows', rows: [moved, ill] } });
    expect(without(rows, 'dead').movements).toMatchObject({
      rows: [{ reference: 'ill', cells: [] }, {}],
    });
  });
});

describe('under survival curves', () => {
  const document = exampleOf('more-time-with-a-new-drug');
  const curvesOf = ({ movements }: ModelDocument) => {
    if (movements.type !== 'survival') throw new Error(movements.type);
    return [...movements.curves.map(({ state }) => state), movements.last];
  };

  test('every state but one may go, and the curves still name each once', () => {
    for (const { id } of document.states) {
      const left = without(document, id);
      expect(curvesOf(left)).toEqual(curvesOf(document).filter((state) => state !== id));
      // One curve and the last: no state can go any more.
      expect(removeState(left, left.states[0]!.id)).toBeNull();
    }
  });
});

test('payoffs that are on it alone go, others lose what is its own', () => {
  const once = {
    label: 'X',
    measure: 'cost',
    category: 'X',
    type: 'once',
    cycle: 0,
    formula: '1',
  } as const;
  const move = {
    label: 'X',
    measure: 'cost',
    category: 'X',
    type: 'movement',
    formula: '1',
  } as const;
  const document = tinyDocument({
    payoffs: [
      { ...once, id: 'both', states: ['alive', 'dead'] },
      { ...once, id: 'one', states: ['dead'] },
      { ...once, id: 'all' },
      { ...move, id: 'to', to: 'dead' },
      { ...move, id: 'any' },
    ],
  });
  const { payoffs } = without(document, 'dead');
  expect(payoffs.map(({ id }) => id)).toEqual(['both', 'all', 'any']);
  expect(payoffs[0]).toMatchObject({ states: ['alive'] });
});

test('the start passes to another share, and the last state stays', () => {
  const shares = [{ id: 'd', state: 'dead', formula: '0.1' }];
  const document = tinyDocument({ start: { remainder: 'alive', shares } });
  expect(without(document, 'alive').start).toEqual({ remainder: 'dead', shares: [] });
  expect(without(document, 'dead').start).toEqual({ remainder: 'alive', shares: [] });
  expect(removeState(without(document, 'dead'), 'alive')).toBeNull();
});
