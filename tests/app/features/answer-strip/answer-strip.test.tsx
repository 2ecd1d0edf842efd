import { fireEvent, render, screen } from '@testing-library/react';
import { describe, expect, it, vi } from 'vitest';
import {
  AnswerStrip,
  type AnswerStripProps,
} from '../../../../src/features/answer-strip/answer-strip.tsx';
import type { Answer } from '../../../../src/store/answer.ts';
import type { DrawsState } from '../../../../src/store/draws.ts';
import { withWords } from '../../setup.ts';

withWords();

const chances = {
  probabilityBest: { value: 0.714, standardError: 0.0143 },
  evpi: { value: 14.2, standardError: 1.3 },
  populationEvpi: { value: 3_123_456, standardError: 280_000 },
  bestOnMean: null,
};
const now: Answer = {
  threshold: 1_500,
  best: 'school',
  tied: [],
  netBenefit: 186.4,
  nmb: new Map(),
  chances,
};
const names = new Map([
  ['now', 'Care as now'],
  ['school', 'Nurses at school'],
]);

function strip(more: Partial<AnswerStripProps> = {}, state?: DrawsState) {
  const run = { state: state ?? ({ status: 'none' } as const), run: vi.fn(), stop: vi.fn() };
  render(
    <AnswerStrip
      now={now}
      was={null}
      names={names}
      comparator="now"
      threshold="KM 1,500 per QALY"
      symbol="KM"
      beneficiaries="Children found each year"
      run={run}
      language="en"
      {...more}
    />,
  );
  return run;
}

const text = () => screen.getByRole('region', { name: 'The answer' }).textContent;

describe('the answer strip', () => {
  it('says what is best, what it is worth, how sure, and what knowing is worth', () => {
    strip();
    expect(text()).toContain('Best at KM 1,500 per QALYNurses at school');
    expect(text()).toContain('KM\u00A0+186');
    expect(text()).toContain('0.71');
    expect(text()).toContain('± 0.01');
    expect(text()).toContain('KM\u00A014 ± 1');
    expect(text()).toContain('KM\u00A03.1 million for all concerned');
  });

  it('shows no "was" before anything has moved, nor where nothing changed', () => {
    strip();
    expect(text()).not.toContain('was');
  });

  it('says what changed, and only that', () => {
    const was = { ...now, best: 'now', netBenefit: 0 };
    strip({ was });
    expect(text()).toContain('was Care as now');
    expect(text()).toContain('was KM\u00A00');
    expect(screen.getAllByText(/^was /)).toHaveLength(2);
  });

  it('keeps raw values beside the words', () => {
    strip();
    const value = (name: string) =>
      document.querySelector(`[data-figure=${name}]`)?.getAttribute('value');
    expect(value('netBenefit')).toBe('186.4');
    expect(value('probabilityBest')).toBe('0.714');
    expect(value('evpi')).toBe('14.2');
  });

  it('shows how far the draws are, and stops them', () => {
    const state = { status: 'running', done: 250, total: 1_000 } as const;
    const run = strip({ now: { ...now, chances: null } }, state);
    expect(screen.getByRole('progressbar').getAttribute('value')).toBe('250');
    expect(text()).toContain('250 of 1,000 draws');
    fireEvent.click(screen.getByRole('button', { name: 'Stop' }));
    expect(run.stop).toHaveBeenCalledOnce();
  });

  it('offers to run again what was stopped or failed, and gives no number', () => {
    const run = strip(
      { now: { ...now, chances: null } },
      { status: 'stopped', done: 250, total: 1_000 },
    );
    expect(document.querySelector('[data-figure=evpi]')).toBeNull();
    fireEvent.click(screen.getByRole('button', { name: 'Run again' }));
    expect(run.run).toHaveBeenCalledOnce();
  });
});
