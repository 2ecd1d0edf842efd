import { expect, test } from 'vitest';
import {
  freshSymbol,
  isNamed,
  ownerOf,
  symbolIssue,
  symbolOf,
} from '../../../shared/formula/edit/symbols.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';

const tiny = tinyDocument();

test.each([
  ['', 'document.missing'],
  ['2x', 'document.invalidFormat'],
  ['coût', 'document.invalidFormat'],
  ['x'.repeat(65), 'document.invalidFormat'],
  ['constructor', 'document.hostileName'],
  ['if', 'names.reserved'],
  ['cycle', 'names.reserved'],
  ['lookup', 'names.reserved'],
  ['rr_die', 'names.duplicate'],
  ['die_now', 'names.duplicate'],
  ['start_age', 'names.duplicate'],
  ['something_new', undefined],
])('the symbol %j: %s', (symbol, code) => {
  expect(symbolIssue(tiny, symbol)?.code).toBe(code);
});

test('a thing may keep its own symbol', () => {
  const named = { what: 'parameter', id: 'rr_die' } as const;
  expect(symbolIssue(tiny, 'rr_die', named)).toBeNull();
  expect(symbolOf(tiny, named)).toBe('rr_die');
  expect(ownerOf(tiny, 'rr_die')?.id).toBe('rr_die');
  expect(isNamed(named)).toBe(true);
  expect(isNamed({ what: 'state', id: 'dead' })).toBe(false);
});

test.each([
  ['Cost of a visit', 'cost_of_a_visit'],
  ['Die now', 'die_now_2'],
  ['Lookup', 'lookup_2'],
  ['Cycle', 'cycle_2'],
  ['2 years', 'x_2_years'],
  ['—', 'x'],
])('%s gets the symbol %s', (label, symbol) => {
  expect(freshSymbol(tiny, label)).toBe(symbol);
});
