import { fireEvent, render, screen } from '@testing-library/react';
import { type ComponentProps, useState } from 'react';
import { describe, expect, it } from 'vitest';
import { NumberField } from '../../../../src/components/form/number-field.tsx';
import { changeSettings } from '../../../../src/store/settings.ts';
import { withWords } from '../../setup.ts';

withWords();

interface HolderProps extends Pick<ComponentProps<typeof NumberField>, 'percent' | 'min' | 'max'> {
  readonly first: number;
  readonly kept: number[];
}

/** A document of one number, and what was put into it. */
function Holder({ first, kept, ...props }: HolderProps) {
  const [value, setValue] = useState(first);
  const onValue = (next: number) => {
    kept.push(next);
    setValue(next);
  };
  return <NumberField label="Rate" value={value} onValue={onValue} {...props} />;
}

function open(first: number, props: Omit<HolderProps, 'first' | 'kept'> = {}) {
  const kept: number[] = [];
  render(<Holder first={first} kept={kept} {...props} />);
  const field = screen.getByRole<HTMLInputElement>('textbox', { name: 'Rate' });
  const type = (text: string) => fireEvent.change(field, { target: { value: text } });
  return { field, kept, type };
}

describe('a number field', () => {
  it('keeps each number as it is typed, and the reader’s text until it is left', () => {
    const { field, kept, type } = open(1);
    for (const text of ['1.', '1.50']) type(text);
    expect(kept).toEqual([1.5]);
    expect(field.value).toBe('1.50');
    fireEvent.blur(field);
    expect(field.value).toBe('1.5');
  });

  it('says what is wrong, and keeps what was sound', () => {
    const { field, kept, type } = open(0.2, { percent: true, min: 0, max: 1 });
    expect(field.value).toBe('20');
    type('120');
    expect(screen.getByText('It must be 100 or less.')).toBeTruthy();
    expect(field.getAttribute('aria-invalid')).toBe('true');
    type('half');
    expect(screen.getByText('This is not a number.')).toBeTruthy();
    type('');
    expect(screen.getByText('Something has to stand here.')).toBeTruthy();
    expect(kept).toEqual([]);
    type('35');
    expect(kept).toEqual([0.35]);
  });

  it('gives up a text that cannot be read before an edit is undone', () => {
    const { field, type } = open(7);
    type('x');
    const goesOn = fireEvent.keyDown(field, { key: 'z', ctrlKey: true });
    expect(goesOn).toBe(false);
    expect(field.value).toBe('7');
    expect(fireEvent.keyDown(field, { key: 'z', ctrlKey: true })).toBe(true);
  });

  it('takes a decimal comma in French', () => {
    changeSettings({ language: 'fr' });
    const { field, kept, type } = open(2.5);
    expect(field.value).toBe('2,5');
    type('1\u202F000,25');
    expect(kept).toEqual([1000.25]);
    changeSettings({ language: 'en' });
  });
});
