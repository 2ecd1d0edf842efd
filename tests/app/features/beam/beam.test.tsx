import { fireEvent, render, screen } from '@testing-library/react';
import { useState } from 'react';
import { describe, expect, it } from 'vitest';
import { lever } from '../../../../shared/analysis/lever.ts';
import { Beam } from '../../../../src/features/beam/beam.tsx';
import { withWords } from '../../setup.ts';

withWords();

// Two strategies 100 apart in cost and 0.1 in health: level at 1,000, by the law of the lever.
const pair = { strategy: 'b', against: 'a', incrementalCost: 100, incrementalHealth: 0.1 };
const names = new Map([
  ['a', 'Usual care'],
  ['b', 'Treatment'],
]);
const segments = [
  { strategy: 'a', tied: [], from: 0, to: 1_000 },
  { strategy: 'b', tied: [], from: 1_000, to: 3_000 },
];

function Weighing({ first = 1_500 }: { first?: number }) {
  const [threshold, setThreshold] = useState(first);
  return (
    <Beam
      scale={{ max: 3_000, step: 50 }}
      threshold={threshold}
      segments={segments}
      ranges={segments}
      notches={[{ id: 'gdp', value: 1_200 }]}
      lever={lever(pair, threshold)}
      pair={pair}
      names={names}
      wordFor={(amount) => `KM ${amount} per QALY`}
      moneyFor={(amount) => `KM ${amount}`}
      best={threshold < 1_000 ? 'Usual care' : 'Treatment'}
      onMove={({ to }) => setThreshold(to)}
      language="en"
    />
  );
}

const slider = () => screen.getByRole('slider');
const said = () => slider().getAttribute('aria-valuetext');
const armTurn = () =>
  slider().querySelector<SVGGElement>('g[style*="rotate"]')?.style.transform ?? '';
const degrees = () => Number(/rotate\((.*)deg\)/.exec(armTurn())?.[1]);

describe('the poise', () => {
  it('is a slider that says its place and what is best there', () => {
    render(<Weighing />);
    expect(slider().getAttribute('aria-valuemin')).toBe('0');
    expect(slider().getAttribute('aria-valuemax')).toBe('3000');
    expect(slider().getAttribute('aria-valuenow')).toBe('1500');
    expect(said()).toBe('KM 1500 per QALY, best: Treatment');
    expect(slider().tabIndex).toBe(0);
  });

  it('moves by its keys', () => {
    render(<Weighing />);
    fireEvent.keyDown(slider(), { key: 'ArrowRight' });
    expect(said()).toBe('KM 1550 per QALY, best: Treatment');
    fireEvent.keyDown(slider(), { key: 'PageDown' });
    fireEvent.keyDown(slider(), { key: 'PageDown' });
    expect(said()).toBe('KM 550 per QALY, best: Usual care');
    fireEvent.keyDown(slider(), { key: 'End' });
    expect(slider().getAttribute('aria-valuenow')).toBe('3000');
    fireEvent.keyDown(slider(), { key: 'Home' });
    expect(slider().getAttribute('aria-valuenow')).toBe('0');
  });

  it('leaves other keys to the page', () => {
    render(<Weighing />);
    // fireEvent gives false where the default was prevented.
    expect(fireEvent.keyDown(slider(), { key: 'Tab' })).toBe(true);
    expect(fireEvent.keyDown(slider(), { key: 'ArrowUp' })).toBe(false);
  });
});

describe('the arm', () => {
  it('lies level where the poise stands at the ratio, and only there', () => {
    const { unmount } = render(<Weighing first={1_000} />);
    expect(degrees()).toBe(0);
    unmount();
    render(<Weighing first={1_050} />);
    expect(degrees()).toBeGreaterThan(0);
  });

  it('tips to the poise above the ratio and to the hook below, and ever more', () => {
    render(<Weighing first={1_000} />);
    const turns = ['ArrowRight', 'PageUp', 'PageUp'].map((key) => {
      fireEvent.keyDown(slider(), { key });
      return degrees();
    });
    expect(turns).toEqual([...turns].sort((a, b) => a - b));
    fireEvent.keyDown(slider(), { key: 'Home' });
    expect(degrees()).toBeLessThan(0);
  });

  it('marks where it would lie level', () => {
    render(<Weighing />);
    expect(slider().textContent).toContain('level at 1,000');
  });
});
