/**
 * The plain meaning of operators and of the functions of school arithmetic, on
 * numbers. True is 1, false is 0; anything but 0 counts as true.
 */

const truth = (holds: boolean): number => (holds ? 1 : 0);

/** By the operators' words (OPERATORS and PREFIX_OPERATORS in expr.ts). */
export const operators = {
  add: (a: number, b: number) => a + b,
  subtract: (a: number, b: number) => a - b,
  multiply: (a: number, b: number) => a * b,
  divide: (a: number, b: number) => a / b,
  power: (a: number, b: number) => a ** b,
  negate: (a: number) => -a,
  less: (a: number, b: number) => truth(a < b),
  less_equal: (a: number, b: number) => truth(a <= b),
  greater: (a: number, b: number) => truth(a > b),
  greater_equal: (a: number, b: number) => truth(a >= b),
  equal: (a: number, b: number) => truth(a === b),
  not_equal: (a: number, b: number) => truth(a !== b),
  and: (a: number, b: number) => truth(a !== 0 && b !== 0),
  or: (a: number, b: number) => truth(a !== 0 || b !== 0),
  not: (a: number) => truth(a === 0),
};

/** `a` where the condition is not 0, else `b`. */
export const choose = (condition: number, a: number, b: number): number =>
  condition === 0 ? b : a;

export const sum = (...terms: number[]): number => terms.reduce((total, term) => total + term, 0);

export const product = (...factors: number[]): number =>
  factors.reduce((total, factor) => total * factor, 1);

/** Nearest whole number; a half goes up (2.5 to 3, -2.5 to -2). */
export const round = (x: number): number => Math.floor(x + 0.5);

/** `x`, but no less than `low` and no more than `high`; `high` where they cross. */
export const clamp = (x: number, low: number, high: number): number =>
  Math.min(Math.max(x, low), high);
