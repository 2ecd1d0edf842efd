/**
 * Sum of products of columns, up to four products a pass: a whole row of a step
 * then costs one pass over the memory instead of one a movement.
 */
import type { Address } from './kernels.ts';

const TERMS_A_PASS = 4;

/** out = sum of left[k] * right[k], summed in the order of k. */
export function dotInto(
  m: Float64Array,
  out: Address,
  left: Int32Array,
  right: Int32Array,
  length: number,
): void {
  const terms = left.length;
  if (terms === 0) m.fill(0, out, out + length);
  for (let first = 0; first < terms; first += TERMS_A_PASS) {
    pass(m, out, left, right, first, Math.min(TERMS_A_PASS, terms - first), length);
  }
}

function pass(
  m: Float64Array,
  out: Address,
  left: Int32Array,
  right: Int32Array,
  k: number,
  terms: number,
  length: number,
): void {
  const last = k + terms - 1;
  const a = left[k]!;
  const b = right[k]!;
  const c = left[Math.min(k + 1, last)]!;
  const d = right[Math.min(k + 1, last)]!;
  const e = left[Math.min(k + 2, last)]!;
  const f = right[Math.min(k + 2, last)]!;
  if (k > 0) more(m, out, left, right, k, terms, length);
  else if (terms === 1) one(m, out, a, b, length);
  else if (terms === 2) two(m, out, a, b, c, d, length);
  else if (terms === 3) three(m, out, a, b, c, d, e, f, length);
  else four(m, out, a, b, c, d, e, f, left[last]!, right[last]!, length);
}

function one(m: Float64Array, out: Address, a: Address, b: Address, length: number): void {
  for (let i = 0; i < length; i++) m[out + i] = m[a + i]! * m[b + i]!;
}

function two(
  m: Float64Array,
  out: Address,
  a: Address,
  b: Address,
  c: Address,
  d: Address,
  length: number,
): void {
  for (let i = 0; i < length; i++) {
    m[out + i] = m[a + i]! * m[b + i]! + m[c + i]! * m[d + i]!;
  }
}

function three(
  m: Float64Array,
  out: Address,
  a: Address,
  b: Address,
  c: Address,
  d: Address,
  e: Address,
  f: Address,
  length: number,
): void {
  for (let i = 0; i < length; i++) {
    m[out + i] = m[a + i]! * m[b + i]! + m[c + i]! * m[d + i]! + m[e + i]! * m[f + i]!;
  }
}

function four(
  m: Float64Array,
  out: Address,
  a: Address,
  b: Address,
  c: Address,
  d: Address,
  e: Address,
  f: Address,
  g: Address,
  h: Address,
  length: number,
): void {
  for (let i = 0; i < length; i++) {
    m[out + i] =
      m[a + i]! * m[b + i]! +
      m[c + i]! * m[d + i]! +
      m[e + i]! * m[f + i]! +
      m[g + i]! * m[h + i]!;
  }
}

/** Adds further terms to what an earlier pass has summed. */
function more(
  m: Float64Array,
  out: Address,
  left: Int32Array,
  right: Int32Array,
  first: number,
  terms: number,
  length: number,
): void {
  for (let k = first; k < first + terms; k++) {
    const a = left[k]!;
    const b = right[k]!;
    for (let i = 0; i < length; i++) m[out + i] = m[out + i]! + m[a + i]! * m[b + i]!;
  }
}
