import { describe, expect, it } from 'vitest';
import { arrival, expandStates } from '../../shared/engine/substates.ts';
import type { State } from '../../shared/model/document.ts';

const states: State[] = [
  { id: 'well', label: 'Well', type: 'ordinary', dead: false },
  { id: 'after', label: 'After', type: 'timed', cycles: 3, dead: false },
  { id: 'dead', label: 'Dead', type: 'absorbing', dead: true },
];

describe('expandStates', () => {
  it('makes a tunnel of a timed state and leaves the others alone', () => {
    const { all, first, length } = expandStates(states);
    expect(all.map(({ state, tunnel }) => [state, tunnel])).toEqual([
      [0, 0],
      [1, 0],
      [1, 1],
      [1, 2],
      [2, 0],
    ]);
    expect(first).toEqual([0, 1, 4]);
    expect(length).toEqual([1, 3, 1]);
  });
});

describe('arrival', () => {
  const substates = expandStates(states);

  it('enters a tunnel at its mouth', () => {
    expect(arrival(substates, substates.all[0]!, 1)).toBe(1);
  });

  it('moves one on by staying, and holds at the last', () => {
    expect(arrival(substates, substates.all[1]!, 1)).toBe(2);
    expect(arrival(substates, substates.all[3]!, 1)).toBe(3);
  });

  it('leaves a tunnel from anywhere', () => {
    expect(arrival(substates, substates.all[2]!, 2)).toBe(4);
  });
});
