import { act, fireEvent, render, screen } from '@testing-library/react';
import { beforeAll, describe, expect, it } from 'vitest';
import { Help } from '../../../../src/features/help/help.tsx';
import { HELP_TOPICS, helpWords } from '../../../../src/i18n/help-words.ts';
import { withWords } from '../../setup.ts';

withWords();

// Fetched when it is first asked for: not while a test waits for it.
beforeAll(async () => {
  await import('../../../../src/features/help/help-panel.tsx');
  await helpWords('en');
});

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

describe('the help on a step', () => {
  it.each(HELP_TOPICS)('answers three questions on %s, and closes', async (topic) => {
    const words = (await helpWords('en')).topics[topic];
    render(<Help topic={topic} />);
    await act(async () => {
      fireEvent.click(screen.getByRole('button', { name: 'Help on this step' }));
    });
    const panel = await screen.findByRole('dialog', { name: 'Help on this step' });
    await screen.findByRole('heading', { name: 'What this is' });
    for (const name of ['What to do', 'What can go wrong']) screen.getByRole('heading', { name });
    for (const line of [words.what, ...words.todo, ...words.wrong])
      expect(panel.textContent).toContain(line);
    fireEvent.keyDown(panel, { key: 'Escape' });
    expect(screen.queryByRole('dialog')).toBeNull();
  });
});

describe('the help in French', () => {
  it('says as much as in English, in words of its own', async () => {
    const [en, fr] = await Promise.all([helpWords('en'), helpWords('fr')]);
    const english = new Set<string>();
    for (const topic of HELP_TOPICS) {
      const [a, b] = [en.topics[topic], fr.topics[topic]];
      expect([b.todo.length, b.wrong.length]).toEqual([a.todo.length, a.wrong.length]);
      for (const line of [a.what, ...a.todo, ...a.wrong]) english.add(line);
      for (const line of [b.what, ...b.todo, ...b.wrong]) {
        expect(english.has(line)).toBe(false);
        // Double punctuation stays on the line.
        expect(line).not.toMatch(/[ ][;:?!»]|«[ ]/);
      }
    }
  });
});
