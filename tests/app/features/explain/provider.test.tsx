import { fireEvent, render, screen } from '@testing-library/react';
import { beforeAll, describe, expect, it } from 'vitest';
import { prepare } from '../../../../shared/engine/engine.ts';
import type { ModelDocument } from '../../../../shared/model/document.ts';
import { ExplainButton } from '../../../../src/features/explain/explain-button.tsx';
import { ExplainProvider } from '../../../../src/features/explain/provider.tsx';
import type { Subject } from '../../../../src/features/explain/subject.ts';
import { tinyDocument } from '../../../fixtures/tiny-document.ts';
import { exampleOf } from '../../example.ts';
import { withWords } from '../../setup.ts';

withWords();

// Fetched when something is asked: not while a test waits for it.
beforeAll(() => import('../../../../src/features/explain/panel.tsx'));

// What jsdom does not have: a dialog opens and closes.
beforeAll(() => {
  Object.assign(HTMLDialogElement.prototype, {
    showModal(this: HTMLDialogElement) {
      this.open = true;
    },
    close(this: HTMLDialogElement) {
      this.open = false;
      this.dispatchEvent(new Event('close'));
    },
  });
});

function ask(document: ModelDocument, subject: Subject) {
  render(
    <ExplainProvider document={document}>
      <ExplainButton subject={subject} of="it" />
    </ExplainProvider>,
  );
  fireEvent.click(screen.getByRole('button', { name: 'Explain it' }));
}

async function figure(name: string): Promise<number> {
  await screen.findByRole('dialog', { name: 'Where this comes from' });
  const found = await screen.findAllByText((_, element) =>
    Boolean(element?.matches(`[data-figure="${name}"]`)),
  );
  return Number(found[0]?.getAttribute('value'));
}

const off = (got: number, want: number) => Math.abs(got - want) / Math.max(1, Math.abs(want));

describe.each([
  ['tiny', tinyDocument()],
  ['keeping-hearts-well', exampleOf('keeping-hearts-well')],
  ['test-before-treating', exampleOf('test-before-treating')],
] as const)('the panel on %s', (_, document) => {
  const base = prepare(document).base({ trace: true });
  const run = base.strategies[1] ?? base.strategies[0];
  if (!run) throw new Error('no strategy');
  const strategy = run.id;

  it.each(['cost', 'outcome'] as const)('sums payoffs to the %s of the engine', async (measure) => {
    ask(document, { what: 'total', strategy, measure });
    expect(off(await figure('explained-total'), run[measure])).toBeLessThan(1e-9);
  });

  it('goes into a payoff whose total is the engine’s, and back', async () => {
    ask(document, { what: 'total', strategy, measure: 'cost' });
    await figure('explained-total');
    const payoff = document.payoffs.find(
      ({ measure, strategies }) => measure === 'cost' && (strategies?.includes(strategy) ?? true),
    );
    const own = run.byPayoff.filter((part) => part.payoff === payoff?.id);
    fireEvent.click(screen.getAllByRole('button', { name: payoff?.label })[0] as HTMLElement);
    const total = own.reduce((sum, part) => sum + part.total, 0);
    expect(off(await figure('explained-payoff'), total)).toBeLessThan(1e-9);
    fireEvent.click(screen.getByRole('button', { name: 'Back' }));
    expect(off(await figure('explained-total'), run.cost)).toBeLessThan(1e-9);
  });

  it('works out an occupancy as the trace has it', async () => {
    const state = document.states[0]?.id ?? '';
    ask(document, { what: 'occupancy', strategy, state, cycle: 2 });
    expect(
      off(await figure('explained-occupancy'), run.trace?.[2]?.[0] ?? Number.NaN),
    ).toBeLessThan(1e-9);
  });
});

describe('the panel', () => {
  it('writes a formula with names, and with values put in', async () => {
    ask(tinyDocument(), {
      what: 'formula',
      strategy: 'treatment',
      path: ['variables', 0, 'formula', 'byStrategy', 'treatment'],
      text: 'p_die * rr_die',
    });
    // 0.1 x 0.8
    expect(await figure('explained-formula')).toBeCloseTo(0.08, 15);
    expect(screen.getByText('p_die * rr_die')).toBeTruthy();
    expect(screen.getByText('= 0.1 * 0.8')).toBeTruthy();
    expect(screen.getByRole('button', { name: 'Probability of dying in a year' })).toBeTruthy();
  });

  it('says where a parameter comes from and where it is used', async () => {
    ask(tinyDocument(), { what: 'parameter', parameter: 'p_die' });
    expect(await figure('explained-parameter')).toBe(0.1);
    expect(screen.getByText(/Invented for a test/)).toBeTruthy();
    expect(screen.getByText(/Probability of dying in a cycle/)).toBeTruthy();
  });

  it('closes', async () => {
    ask(tinyDocument(), { what: 'parameter', parameter: 'p_die' });
    await figure('explained-parameter');
    fireEvent.click(screen.getByRole('button', { name: 'Close' }));
    expect(screen.queryByRole('dialog')).toBeNull();
  });
});
