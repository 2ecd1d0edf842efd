/**
 * The elementwise operations that have a kernel of their own, and what each means
 * for one number. Constants are folded with these meanings and the plain kernels
 * loop over them, so a folded constant equals a computed one to the last bit.
 * True is 1, false is 0; anything but 0 counts as true.
 */

export const unaryMeaning = {
  negate: (a: number) => -a,
  abs: Math.abs,
  exp: Math.exp,
  expm1: Math.expm1,
  ln: Math.log,
  log1p: Math.log1p,
  log10: Math.log10,
  sqrt: Math.sqrt,
  floor: Math.floor,
  round: (a: number) => Math.floor(a + 0.5),
  not: (a: number) => (a === 0 ? 1 : 0),
} satisfies Record<string, (a: number) => number>;

export type UnaryOp = keyof typeof unaryMeaning;

export const binaryMeaning = {
  add: (a: number, b: number) => a + b,
  subtract: (a: number, b: number) => a - b,
  multiply: (a: number, b: number) => a * b,
  divide: (a: number, b: number) => a / b,
  power: (a: number, b: number) => a ** b,
  min: (a: number, b: number) => Math.min(a, b),
  max: (a: number, b: number) => Math.max(a, b),
  less: (a: number, b: number) => (a < b ? 1 : 0),
  less_equal: (a: number, b: number) => (a <= b ? 1 : 0),
  greater: (a: number, b: number) => (a > b ? 1 : 0),
  greater_equal: (a: number, b: number) => (a >= b ? 1 : 0),
  equal: (a: number, b: number) => (a === b ? 1 : 0),
  not_equal: (a: number, b: number) => (a !== b ? 1 : 0),
  and: (a: number, b: number) => (a !== 0 && b !== 0 ? 1 : 0),
  or: (a: number, b: number) => (a !== 0 || b !== 0 ? 1 : 0),
  /**
   * (1 - exp(-a b)) / a, years at risk of leaving at rate a within b years; b where
   * a is 0. Times one of several competing rates it is that rate's chance.
   */
  exposure: (a: number, b: number) => (a === 0 ? b : -Math.expm1(-a * b) / a),
} satisfies Record<string, (a: number, b: number) => number>;

export type BinaryOp = keyof typeof binaryMeaning;
