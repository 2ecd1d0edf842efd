import { fireEvent, render, screen } from '@testing-library/react';
import { useState } from 'react';
import { beforeAll, describe, expect, it, vi } from 'vitest';
import { Levers } from '../../../../src/features/levers/levers.tsx';
import type { Override } from '../../../../src/store/levers.ts';
import { tinyDocument } from '../../../fixtures/tiny-document.ts';
import { withWords } from '../../setup.ts';

withWords();

// Fetched when it is opened: not while a test waits for it.
beforeAll(() => import('../../../../src/features/levers/levers-panel.tsx'));

interface HeldProps {
  readonly onMove: (overrides: readonly Override[]) => void;
  readonly onKeep: (label: string) => void;
}

function Held({ onMove, onKeep }: HeldProps) {
  const [overrides, setOverrides] = useState<readonly Override[]>([]);
  const set = (next: readonly Override[]) => {
    onMove(next);
    setOverrides(next);
  };
  const levers = { overrides, set };
  return <Levers document={tinyDocument()} levers={levers} onKeep={onKeep} language="en" />;
}

function panel(onKeep = vi.fn()) {
  const moves: (readonly Override[])[] = [];
  render(<Held onMove={(next) => moves.push(next)} onKeep={onKeep} />);
  fireEvent.click(screen.getByRole('button', { name: 'What if…' }));
  return { moves, onKeep };
}

async function choose(target: string) {
  fireEvent.change(await screen.findByLabelText('Add a lever'), { target: { value: target } });
}

describe('the what-if panel', () => {
  it('slides a chosen parameter, and says what it was', async () => {
    const { moves } = panel();
    await choose('parameter rr_die');
    const slider = screen.getByRole('slider', { name: 'Relative risk of dying on treatment' });
    fireEvent.change(slider, { target: { value: '0.7' } });
    const [moved] = moves.at(-1) ?? [];
    expect(moved).toMatchObject({ type: 'parameter', parameter: 'rr_die' });
    expect((moved as { value: number }).value).toBeCloseTo(0.7, 2);
    expect(screen.getByText('was 0.8 ratio')).toBeTruthy();
  });

  it('offers each target once', async () => {
    panel();
    await choose('setting horizon');
    expect(screen.queryByRole('option', { name: 'Time horizon' })).toBeNull();
    expect(screen.getByRole('slider', { name: 'Time horizon' })).toBeTruthy();
  });

  it('is kept under the name that is given', async () => {
    const { onKeep } = panel();
    await choose('setting discountCosts');
    fireEvent.change(screen.getByLabelText('Name of the scenario'), {
      target: { value: 'Undiscounted' },
    });
    fireEvent.click(screen.getByRole('button', { name: 'Keep as a scenario' }));
    expect(onKeep).toHaveBeenCalledWith('Undiscounted');
  });

  it('drops one, or all', async () => {
    const { moves } = panel();
    await choose('setting horizon');
    await choose('parameter rr_die');
    fireEvent.click(screen.getByRole('button', { name: 'Drop the lever Time horizon' }));
    expect(moves.at(-1)).toHaveLength(1);
    fireEvent.click(screen.getByRole('button', { name: 'Drop all levers' }));
    expect(moves.at(-1)).toEqual([]);
  });
});
