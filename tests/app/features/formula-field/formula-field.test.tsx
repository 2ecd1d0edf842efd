import { act, fireEvent, render, screen } from '@testing-library/react';
import { useState } from 'react';
import { describe, expect, it } from 'vitest';
import { type Issue, warning } from '../../../../shared/model/issue.ts';
import { FormulaField } from '../../../../src/features/formula-field/formula-field.tsx';
import { formulaNames } from '../../../../src/features/formula-field/formula-names.ts';
import { tinyDocument } from '../../../fixtures/tiny-document.ts';
import { withWords } from '../../setup.ts';

withWords();

const document_ = tinyDocument();
const names = formulaNames(document_);

function Harness({ first, issues = [] }: { first: string; issues?: readonly Issue[] }) {
  const [value, setValue] = useState(first);
  return (
    <>
      <FormulaField
        label="To dead"
        value={value}
        names={names}
        document={document_}
        issues={issues}
        onChange={setValue}
      />
      <output>{value}</output>
      <button type="button" onClick={() => setValue('p_die')}>
        undo
      </button>
    </>
  );
}

const field = () => screen.getByLabelText<HTMLTextAreaElement>('To dead');
/** What is typed is sent on after the keystroke. */
const settle = () => act(() => new Promise((done) => setTimeout(done, 5)));

async function type(text: string) {
  fireEvent.change(field(), { target: { value: text } });
  await settle();
}

describe('completion', () => {
  it('opens as one types, is walked by arrow keys and taken by Enter', async () => {
    render(<Harness first="1" />);
    await type('1 - p_');
    expect(screen.getByRole('listbox')).toBeTruthy();
    const options = screen.getAllByRole('option');
    expect(options[0]?.textContent).toContain('p_die');
    expect(field().getAttribute('aria-activedescendant')).toBe(options[0]?.id);
    fireEvent.keyDown(field(), { key: 'Enter' });
    await settle();
    expect(field().value).toBe('1 - p_die');
    expect(screen.queryByRole('listbox')).toBeNull();
  });

  it('is taken by mouse, says the arguments of a function, and closes by Escape', async () => {
    render(<Harness first="1" />);
    await type('cha');
    const option = screen
      .getAllByRole('option')
      .find((one) => one.textContent?.startsWith('chance('));
    expect(option?.textContent).toContain('chance(rate, years)');
    fireEvent.mouseDown(option as HTMLElement);
    await settle();
    expect(field().value).toBe('chance()');
    await type('chance(p');
    fireEvent.keyDown(field(), { key: 'Escape' });
    expect(screen.queryByRole('listbox')).toBeNull();
  });

  it('comes by Ctrl and space, and wraps round by the up arrow', async () => {
    render(<Harness first="" />);
    fireEvent.keyDown(field(), { key: ' ', ctrlKey: true });
    const options = screen.getAllByRole('option');
    fireEvent.keyDown(field(), { key: 'ArrowUp' });
    expect(field().getAttribute('aria-activedescendant')).toBe(options.at(-1)?.id);
  });
});

describe('what is wrong', () => {
  it('is underlined at its place and said below, with a suggestion', async () => {
    render(<Harness first="p_die" />);
    await type('p_die * rr_dei');
    const mark = document.querySelector('[data-mark=error]');
    expect(mark?.textContent).toBe('rr_dei');
    expect(screen.getByText(/Did you mean rr_die\?/)).toBeTruthy();
    expect(field().getAttribute('aria-invalid')).toBe('true');
    expect(field().getAttribute('aria-describedby')).toBeTruthy();
  });

  it('comes from the check of the document where the text itself is sound', () => {
    const at = { start: 0, end: 5 };
    const issue = warning('formula.mixedFlows', [], { left: 'costOnce', right: 'costPerYear' }, at);
    render(<Harness first="p_die + rr_die" issues={[issue]} />);
    expect(document.querySelector('[data-mark=warning]')?.textContent).toBe('p_die');
  });
});

describe('the value', () => {
  it('is sent as typed, and one from elsewhere is shown', async () => {
    render(<Harness first="p_die" />);
    await type('p_die * 2');
    expect(screen.getByText('p_die * 2', { selector: 'output' })).toBeTruthy();
    fireEvent.click(screen.getByText('undo'));
    expect(field().value).toBe('p_die');
  });
});
