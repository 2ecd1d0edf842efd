import { expect, it } from 'vitest';
import { scan } from '../../shared/formula/scan.ts';
import { checkSyntax } from '../../shared/formula/syntax.ts';

function check(text: string, depth = 200) {
  const scanned = scan(text);
  if ('issue' in scanned) throw new Error(scanned.issue.code);
  const issue = checkSyntax(scanned.tokens, depth);
  return issue && [issue.code, issue.at?.start, issue.at?.end];
}

it.each(['1', 'f()', 'f(a, -b, (c))', '- - 1', 'not a and not (b)', 'a or not not b'])(
  'lets %s pass',
  (text) => expect(check(text)).toBeUndefined(),
);

it('counts open brackets and prefixes together', () => {
  expect(check('((-1))', 3)).toBeUndefined();
  expect(check('((-1))', 2)).toEqual(['formula.tooDeep', 2, 3]);
  expect(check('(1) + (1) + -1', 1)).toBeUndefined();
});

it('names the innermost bracket left open', () => {
  expect(check('f(1) + (2 * (3')).toEqual(['formula.unclosedBracket', 12, 13]);
});

it('allows not only where a whole condition may stand', () => {
  expect(check('if(not a, 1, 2)')).toBeUndefined();
  expect(check('a < not b')).toEqual(['formula.misplacedNot', 4, 7]);
  expect(check('- not b')).toEqual(['formula.misplacedNot', 2, 5]);
});
