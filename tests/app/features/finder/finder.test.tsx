import { fireEvent, render, screen, waitFor } from '@testing-library/react';
import { beforeAll, describe, expect, it, vi } from 'vitest';
import { Finder } from '../../../../src/features/finder/finder.tsx';
import { tinyDocument } from '../../../fixtures/tiny-document.ts';
import { withWords } from '../../setup.ts';

withWords();

// Fetched when it is first opened: not while a test waits for it.
beforeAll(() => import('../../../../src/features/finder/finder-dialog.tsx'));

// What jsdom does not have: a dialog opens, and gives the focus back when it closes.
beforeAll(() => {
  let before: Element | null = null;
  Object.assign(HTMLDialogElement.prototype, {
    showModal(this: HTMLDialogElement) {
      before = document.activeElement;
      this.open = true;
      this.querySelector('input')?.focus();
    },
    close(this: HTMLDialogElement) {
      this.open = false;
      if (before instanceof HTMLElement) before.focus();
      this.dispatchEvent(new Event('close'));
    },
  });
});

function setUp() {
  const go = vi.fn();
  const act = vi.fn();
  const entries = [
    { id: 'results', kind: 'step' as const, name: 'Results', act },
    { id: 'keys', kind: 'action' as const, name: 'Keys', act: vi.fn() },
  ];
  render(<Finder document={tinyDocument()} entries={entries} go={go} />);
  return { go, act };
}

async function opened() {
  return screen.findByRole('combobox', { name: 'What are you looking for?' });
}

const marked = () => screen.getByRole('option', { selected: true });

describe('the finder', () => {
  it('opens by Ctrl or Cmd with K, and by its button', async () => {
    setUp();
    fireEvent.keyDown(document.body, { key: 'k', ctrlKey: true });
    fireEvent.keyDown(await opened(), { key: 'Escape' });
    await waitFor(() => expect(screen.queryByRole('combobox')).toBeNull());
    fireEvent.click(screen.getByRole('button', { name: 'Find' }));
    await opened();
  });

  it('moves the mark by the arrows, round the ends, and tells the field', async () => {
    const { act } = setUp();
    fireEvent.keyDown(document.body, { key: 'K', metaKey: true });
    const field = await opened();
    expect(marked().textContent).toContain('Results');
    fireEvent.keyDown(field, { key: 'ArrowUp' });
    expect(marked().textContent).toContain('Keys');
    expect(field.getAttribute('aria-activedescendant')).toBe(marked().id);
    fireEvent.keyDown(field, { key: 'ArrowDown' });
    fireEvent.keyDown(field, { key: 'Enter' });
    expect(act).toHaveBeenCalledOnce();
    expect(screen.queryByRole('combobox')).toBeNull();
  });

  it('gives the focus back on Escape', async () => {
    setUp();
    const button = screen.getByRole('button', { name: 'Find' });
    button.focus();
    fireEvent.click(button);
    fireEvent.keyDown(await opened(), { key: 'Escape' });
    expect(document.activeElement).toBe(button);
  });

  const { parameters, variables } = tinyDocument();
  const leads: readonly (readonly [string, string, string])[] = [
    ['Treatment', 'question', 'treatment'],
    ['Alive', 'model/states', 'alive'],
    ...parameters.map(({ id, symbol }) => [symbol, `evidence?parameter=${id}`, id] as const),
    ...variables.map(({ id, symbol }) => [symbol, 'model/variables', id] as const),
  ];

  it.each(leads)('leads from "%s" to %s', async (text, to, id) => {
    const { go } = setUp();
    fireEvent.keyDown(document.body, { key: 'k', ctrlKey: true });
    const field = await opened();
    fireEvent.change(field, { target: { value: text } });
    fireEvent.keyDown(field, { key: 'Enter' });
    expect(go).toHaveBeenCalledWith(to, id);
  });

  it('says so when nothing has that name', async () => {
    setUp();
    fireEvent.keyDown(document.body, { key: 'k', ctrlKey: true });
    fireEvent.change(await opened(), { target: { value: 'zzz' } });
    expect(screen.getByRole('status').textContent).toContain('Nothing has that name');
    expect(screen.queryAllByRole('option')).toEqual([]);
  });
});
