import { expect, it } from 'vitest';
import { scan } from '../../shared/formula/scan.ts';

it('cuts a formula into tokens with their places', () => {
  const scanned = scan('f(.5e-1, x_1)>=2 and y');
  if ('issue' in scanned) throw new Error(scanned.issue.code);
  expect(scanned.tokens.map((token) => [token.type, token.text, token.at.start])).toEqual([
    ['word', 'f', 0],
    ['open', '(', 1],
    ['number', '.5e-1', 2],
    ['comma', ',', 7],
    ['word', 'x_1', 9],
    ['close', ')', 12],
    ['operator', '>=', 13],
    ['number', '2', 15],
    ['word', 'and', 17],
    ['word', 'y', 21],
  ]);
});

it('stops at the first character that is none of the language', () => {
  const scanned = scan('a % b @');
  if (!('issue' in scanned)) throw new Error('scanned');
  expect(scanned.issue).toMatchObject({
    code: 'formula.strayCharacter',
    params: { character: '%' },
    at: { start: 2, end: 3 },
  });
});
