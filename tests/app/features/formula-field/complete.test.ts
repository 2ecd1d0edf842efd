import { describe, expect, it } from 'vitest';
import { completed, completionsAt } from '../../../../src/features/formula-field/complete.ts';
import { formulaNames } from '../../../../src/features/formula-field/formula-names.ts';
import { tinyDocument } from '../../../fixtures/tiny-document.ts';

const names = formulaNames(tinyDocument());
const symbols = (text: string, caret = text.length) =>
  completionsAt(text, caret, names)?.options.map(({ symbol }) => symbol) ?? [];

describe('completionsAt', () => {
  it('offers what begins as typed, the document’s own names first', () => {
    expect(symbols('1 - p_')[0]).toBe('p_die');
    expect(symbols('ch')).toContain('chance');
  });

  it('finds a parameter by a word of its label', () => {
    expect(symbols('utility')).toContain('u_alive');
  });

  it('knows the word that the caret is in, not the text’s last', () => {
    expect(symbols('rr_ * p_die', 3)[0]).toBe('rr_die');
  });

  it('offers nothing after a number, or for a word that is whole', () => {
    expect(symbols('1e')).toEqual([]);
    expect(symbols('start_age')).toEqual([]);
    expect(symbols('')).toEqual([]);
  });

  it('offers everything where it is asked to', () => {
    expect(completionsAt('', 0, names, true)?.options.length).toBeGreaterThan(5);
  });
});

describe('completed', () => {
  const choose = (text: string, caret: number, symbol: string) => {
    const found = completionsAt(text, caret, names);
    const chosen = names.bySymbol.get(symbol);
    if (!found || !chosen) throw new Error('nothing to choose');
    return completed(text, found, chosen);
  };

  it('puts the whole name in the place of the word', () => {
    expect(choose('1 - p_d', 7, 'p_die')).toEqual({ text: '1 - p_die', caret: 9 });
    expect(choose('rr * 2', 2, 'rr_die')).toEqual({ text: 'rr_die * 2', caret: 6 });
  });

  it('gives a function its brackets, and none where it has them', () => {
    expect(choose('chan', 4, 'chance')).toEqual({ text: 'chance()', caret: 7 });
    expect(choose('chan(1, 2)', 4, 'chance')).toEqual({ text: 'chance(1, 2)', caret: 6 });
  });
});
