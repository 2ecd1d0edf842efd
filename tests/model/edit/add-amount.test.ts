import { expect, test } from 'vitest';
import { addAmount } from '../../../shared/model/edit/add-amount.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';
import { soundAfter } from './after.ts';

const tiny = tinyDocument();

test('a payoff pays in one more state', () => {
  const { edits } = addAmount(tiny, 'drug', { state: 'dead', formula: 'c_year / 2' });
  expect(soundAfter(tiny, edits).payoffs[0]).toMatchObject({
    amounts: [{ state: 'alive' }, { id: 'dead', state: 'dead', formula: 'c_year / 2' }],
  });
});

test('but not twice, nor where there is no such payoff', () => {
  expect(() => addAmount(tiny, 'drug', { state: 'alive' })).toThrowError('edit.badValue');
  expect(() => addAmount(tiny, 'nothing', { state: 'alive' })).toThrowError('edit.noSuchItem');
  const once = { ...tiny.payoffs[0]!, type: 'once' as const, cycle: 0, formula: '1' };
  const document = tinyDocument({ payoffs: [once] });
  expect(() => addAmount(document, 'drug', { state: 'dead' })).toThrowError('edit.noSuchPlace');
});
