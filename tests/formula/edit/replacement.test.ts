import { expect, test } from 'vitest';
import { replacementOf } from '../../../shared/formula/edit/replacement.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';

const tiny = tinyDocument();

test('a number stands for a parameter', () => {
  const change = replacementOf(tiny, { what: 'parameter', id: 'rr_die' });
  expect(change?.('rr_die + x', undefined)).toBe('0.8 + x');
  expect(change?.('x', undefined)).toBe('x');
});

test('there is none for a table, for what is not there, or where profiles differ', () => {
  expect(replacementOf(tiny, { what: 'table', id: 'x' })).toBeNull();
  expect(replacementOf(tiny, { what: 'parameter', id: 'x' })).toBeNull();
  const profiles = [30, 40].map((start_age, index) => {
    return { id: `p${index}`, label: 'P', share: 0.5, covariates: { start_age } };
  });
  expect(
    replacementOf(tinyDocument({ profiles }), { what: 'covariate', id: 'start_age' }),
  ).toBeNull();
});

test('nor where a formula would grow too long', () => {
  const long = Array(200).fill('die_now').join(' + ');
  const [variable] = tiny.variables;
  const variables = [
    { ...variable!, formula: Array(20).fill('p_die').join(' + ') },
    { ...variable!, id: 'sum', symbol: 'sum_of_all', formula: long },
  ];
  expect(replacementOf(tinyDocument({ variables }), { what: 'variable', id: 'v_die' })).toBeNull();
});
