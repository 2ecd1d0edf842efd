import { describe, expect, it } from 'vitest';
import type { Expr } from '../../shared/formula/expr.ts';
import { parseFormula, readFormula } from '../../shared/formula/parse.ts';

/** The tree as one line, such as `add(a, 1)`. */
function shape(expr: Expr): string {
  if (expr.type === 'number') return String(expr.value);
  if (expr.type === 'name') return expr.name;
  return `${expr.fn}(${expr.args.map(shape).join(', ')})`;
}

function exprOf(text: string): Expr {
  const parsed = parseFormula(text);
  if (!parsed.expr) throw new Error(`${text}: ${JSON.stringify(parsed.issues)}`);
  return parsed.expr;
}

const shapeOf = (text: string) => shape(exprOf(text));

/** Every part of the tree with the text its span cuts out. */
function pieces(text: string): string[] {
  const list: string[] = [];
  const walk = (expr: Expr) => {
    list.push(`${shape(expr)} = ${text.slice(expr.at.start, expr.at.end)}`);
    if (expr.type === 'call') expr.args.forEach(walk);
  };
  walk(exprOf(text));
  return list;
}

function issueOf(text: string) {
  const issues = parseFormula(text).issues;
  if (!issues) throw new Error(`${text} parsed`);
  expect(issues).toHaveLength(1);
  const [issue] = issues;
  if (!issue) throw new Error('no issue');
  const { code, params, at } = issue;
  return { code, params, at: at ? [at.start, at.end] : undefined };
}

describe('precedence', () => {
  // Mathematical convention (common practice, no source): power before sign, from the right.
  it.each([
    ['-2^2', 'negate(power(2, 2))'],
    ['2^3^2', 'power(2, power(3, 2))'],
    ['2^-3^2', 'power(2, negate(power(3, 2)))'],
    ['-a * b', 'multiply(negate(a), b)'],
    ['a - b - c', 'subtract(subtract(a, b), c)'],
    ['a / b * c', 'multiply(divide(a, b), c)'],
    ['a + b * c ^ d', 'add(a, multiply(b, power(c, d)))'],
    ['a - -b', 'subtract(a, negate(b))'],
    ['- - a', 'negate(negate(a))'],
    ['(a + b) * c', 'multiply(add(a, b), c)'],
    ['a < b and c >= d or e == f', 'or(and(less(a, b), greater_equal(c, d)), equal(e, f))'],
    ['a or b and c', 'or(a, and(b, c))'],
    ['not a < b', 'not(less(a, b))'],
    ['not a and b', 'and(not(a), b)'],
    ['not not a', 'not(not(a))'],
    ['a and not b + 1 == c', 'and(a, not(equal(add(b, 1), c)))'],
    ['not -a ^ 2 < b', 'not(less(negate(power(a, 2)), b))'],
    ['a * -b ^ c * d', 'multiply(multiply(a, negate(power(b, c))), d)'],
    ['(a < b) < c', 'less(less(a, b), c)'],
  ])('%s', (text, want) => expect(shapeOf(text)).toBe(want));
});

describe('values', () => {
  it.each([
    ['1', '1'],
    ['.5', '0.5'],
    ['1.5e3', '1500'],
    ['2E-3', '0.002'],
    ['true', '1'],
    ['false', '0'],
    ['if(a, 1, 2)', 'if(a, 1, 2)'],
    ['min(a, max(b, c), 1)', 'min(a, max(b, c), 1)'],
    ['f()', 'f()'],
    ['chance (r, 1)', 'chance(r, 1)'],
    ['orchid + android + nothing', 'add(add(orchid, android), nothing)'],
    ['not(a)', 'not(a)'],
    ['a or(b)', 'or(a, b)'],
    ['\n a\t+\r\n b ', 'add(a, b)'],
    ['this + null', 'add(this, null)'],
    ['this(1)', 'this(1)'],
    ['hasOwnProperty + toString', 'add(hasOwnProperty, toString)'],
    ['constructor(__proto__)', 'constructor(__proto__)'],
  ])('%j', (text, want) => expect(shapeOf(text)).toBe(want));
});

describe('spans', () => {
  it('cover each part, without the brackets around it', () => {
    expect(pieces(' ( a + 2.50 ) *-chance( r , (1) ) ')).toEqual([
      'multiply(add(a, 2.5), negate(chance(r, 1))) = ( a + 2.50 ) *-chance( r , (1) )',
      'add(a, 2.5) = a + 2.50',
      'a = a',
      '2.5 = 2.50',
      'negate(chance(r, 1)) = -chance( r , (1) )',
      'chance(r, 1) = chance( r , (1) )',
      'r = r',
      '1 = 1',
    ]);
  });

  it('follow the precedence of prefix operators', () => {
    expect(pieces('not  a < - b ^ 2 and c')).toEqual([
      'and(not(less(a, negate(power(b, 2)))), c) = not  a < - b ^ 2 and c',
      'not(less(a, negate(power(b, 2)))) = not  a < - b ^ 2',
      'less(a, negate(power(b, 2))) = a < - b ^ 2',
      'a = a',
      'negate(power(b, 2)) = - b ^ 2',
      'power(b, 2) = b ^ 2',
      'b = b',
      '2 = 2',
      'c = c',
    ]);
  });

  it('see through doubled brackets on either side', () => {
    expect(pieces('((a)) - (((b - (c))))')).toEqual([
      'subtract(a, subtract(b, c)) = ((a)) - (((b - (c))))',
      'a = a',
      'subtract(b, c) = b - (c)',
      'b = b',
      'c = c',
    ]);
  });
});

describe('what is wrong, and where', () => {
  it.each([
    ['', 'formula.empty', {}, undefined],
    [' \n', 'formula.empty', {}, undefined],
    ['a +', 'formula.incomplete', { after: '+' }, [2, 3]],
    ['not', 'formula.incomplete', { after: 'not' }, [0, 3]],
    ['f(a,', 'formula.incomplete', { after: ',' }, [3, 4]],
    ['a + * b', 'formula.valueExpected', { found: '*' }, [4, 5]],
    ['a + and', 'formula.valueExpected', { found: 'and' }, [4, 7]],
    ['+a', 'formula.valueExpected', { found: '+' }, [0, 1]],
    ['()', 'formula.valueExpected', { found: ')' }, [1, 2]],
    ['f(a,)', 'formula.valueExpected', { found: ')' }, [4, 5]],
    ['f(,a)', 'formula.valueExpected', { found: ',' }, [2, 3]],
    ['a b', 'formula.operatorExpected', { found: 'b' }, [2, 3]],
    ['a AND b', 'formula.operatorExpected', { found: 'AND', instead: 'and' }, [2, 5]],
    ['2 (a)', 'formula.operatorExpected', { found: '(' }, [2, 3]],
    ['f(a)(b)', 'formula.operatorExpected', { found: '(' }, [4, 5]],
    ['true(1)', 'formula.operatorExpected', { found: '(' }, [4, 5]],
    ['a, b', 'formula.operatorExpected', { found: ',' }, [1, 2]],
    ['(a, b)', 'formula.operatorExpected', { found: ',' }, [2, 3]],
    ['a + 1,5', 'formula.decimalComma', { text: '1,5' }, [4, 7]],
    ['(a', 'formula.unclosedBracket', { found: '(' }, [0, 1]],
    ['a)', 'formula.unopenedBracket', { found: ')' }, [1, 2]],
    [') a', 'formula.unopenedBracket', { found: ')' }, [0, 1]],
    ['1 + not a', 'formula.misplacedNot', { found: 'not' }, [4, 7]],
    ['0 < p < 1', 'formula.chainedComparison', {}, [0, 9]],
    ['12abc', 'formula.badNumber', { text: '12abc' }, [0, 5]],
    ['1.2.3', 'formula.badNumber', { text: '1.2.3' }, [0, 5]],
    ['0x1F', 'formula.badNumber', { text: '0x1F' }, [0, 4]],
    ['1e', 'formula.badNumber', { text: '1e' }, [0, 2]],
    ['1e999', 'formula.numberTooLarge', { text: '1e999' }, [0, 5]],
    ['add(1, 2)', 'formula.unknownFunction', { name: 'add' }, [0, 3]],
    ['a = b', 'formula.strayCharacter', { character: '=', instead: '==' }, [2, 3]],
    ['a && b', 'formula.strayCharacter', { character: '&&', instead: 'and' }, [2, 4]],
    ['a \u2212 b', 'formula.strayCharacter', { character: '\u2212', instead: '-' }, [2, 3]],
    ['a.b', 'formula.strayCharacter', { character: '.' }, [1, 2]],
    ['a[1]', 'formula.strayCharacter', { character: '[', instead: '(' }, [1, 2]],
    ['"a"', 'formula.strayCharacter', { character: '"' }, [0, 1]],
    ['a ? b : c', 'formula.strayCharacter', { character: '?' }, [2, 3]],
    ['a // b', 'formula.valueExpected', { found: '/' }, [3, 4]],
    ['\u{1F600}', 'formula.strayCharacter', { character: '\u{1F600}' }, [0, 2]],
    ['caf\u00e9', 'formula.strayCharacter', { character: '\u00e9' }, [3, 4]],
  ])('%j: %s', (text, code, params, at) => {
    expect(issueOf(text)).toEqual({ code, params, at });
  });
});

describe('limits', () => {
  it('refuses a text past 4,000 characters', () => {
    expect(parseFormula(`1${' '.repeat(3_999)}`).expr).toBeDefined();
    expect(issueOf('1'.repeat(4_001))).toMatchObject({
      code: 'formula.tooLong',
      params: { length: 4_001, limit: 4_000 },
    });
  });

  it('refuses brackets and prefixes nested past 200', () => {
    const nested = (open: string, close: string, times: number) =>
      `${open.repeat(times)}1${close.repeat(times)}`;
    expect(parseFormula(nested('(', ')', 200)).expr).toBeDefined();
    expect(parseFormula(nested('-', '', 199)).expr).toBeDefined();
    expect(issueOf(nested('(', ')', 201)).code).toBe('formula.tooDeep');
    expect(issueOf(nested('abs(', ')', 201)).code).toBe('formula.tooDeep');
    expect(issueOf(nested('-', '', 201))).toEqual({
      code: 'formula.tooDeep',
      params: { limit: 200 },
      at: [200, 201],
    });
    expect(issueOf(nested('not ', '', 201)).code).toBe('formula.tooDeep');
  });

  it('refuses more numbers, names and calls than the limit', () => {
    const limits = { length: 4_000, depth: 200, nodes: 5 };
    expect(readFormula('a + b + c', limits).expr).toBeDefined();
    const issues = readFormula('a + b + c + d', limits).issues;
    expect(issues?.[0]).toMatchObject({ code: 'formula.tooLarge', params: { limit: 5 } });
  });

  it('counts each operator of a chain as a level', () => {
    for (const operator of ['+', '^', ' and ']) {
      const chain = (times: number) => `1${`${operator}1`.repeat(times)}`;
      expect(parseFormula(chain(199)).expr).toBeDefined();
      expect(issueOf(chain(200)).code).toBe('formula.tooDeep');
      expect(issueOf(chain(600)).code).toBe('formula.tooDeep');
    }
    expect(parseFormula(`sum(${Array(1_500).fill('1').join(',')})`).expr).toBeDefined();
  });

  it('gives the same answer again for the same text', () => {
    expect(parseFormula('a + 1')).toBe(parseFormula('a + 1'));
  });
});
