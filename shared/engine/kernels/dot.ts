/**
 * Sums of products of columns, up to four products a pass: a whole row of a step
 * then costs one pass over the memory instead of one a movement.
 *
 * The loops run over the output's own addresses and reach the inputs by their
 * distance from it (`| 0` keeps that in 32-bit integers), which is the shortest
 * address arithmetic that compilers make of it.
 */
import type { Address } from './kernels.ts';

const TERMS_A_PASS = 4;

/** Distance of a term's column from the output; terms beyond the last are not read. */
function distance(columns: Int32Array, k: number, out: Address): number {
  return k < columns.length ? (columns[k]! - out) | 0 : 0;
}

/** out = sum of left[k] * right[k], summed in the order of k. */
export function dotInto(
  m: Float64Array,
  out: Address,
  left: Int32Array,
  right: Int32Array,
  length: number,
): void {
  const end = out + length;
  const terms = left.length;
  if (terms === 0) {
    m.fill(0, out, end);
    return;
  }
  const p = distance(left, 0, out);
  const q = distance(right, 0, out);
  const p1 = distance(left, 1, out);
  const q1 = distance(right, 1, out);
  const p2 = distance(left, 2, out);
  const q2 = distance(right, 2, out);
  if (terms === 1) one(m, out, end, p, q);
  else if (terms === 2) two(m, out, end, p, q, p1, q1);
  else if (terms === 3) three(m, out, end, p, q, p1, q1, p2, q2);
  else {
    const p3 = distance(left, 3, out);
    four(m, out, end, p, q, p1, q1, p2, q2, p3, distance(right, 3, out));
  }
  for (let k = TERMS_A_PASS; k < terms; k++) addProductInto(m, out, left[k]!, right[k]!, length);
}

/** The same, and sum += weight * out in the same pass. */
export function dotAddingInto(
  m: Float64Array,
  out: Address,
  left: Int32Array,
  right: Int32Array,
  sum: Address,
  weight: number,
  length: number,
): void {
  const terms = left.length;
  if (terms === 0 || terms > 3) {
    dotInto(m, out, left, right, length);
    addScaledInto(m, sum, out, weight, length);
    return;
  }
  const end = out + length;
  const s = (sum - out) | 0;
  const p = distance(left, 0, out);
  const q = distance(right, 0, out);
  const p1 = distance(left, 1, out);
  const q1 = distance(right, 1, out);
  if (terms === 1) oneAdding(m, out, end, p, q, s, weight);
  else if (terms === 2) twoAdding(m, out, end, p, q, p1, q1, s, weight);
  else {
    const p2 = distance(left, 2, out);
    threeAdding(m, out, end, p, q, p1, q1, p2, distance(right, 2, out), s, weight);
  }
}

/** out += weight * a */
export function addScaledInto(
  m: Float64Array,
  out: Address,
  a: Address,
  weight: number,
  length: number,
): void {
  const end = out + length;
  const p = (a - out) | 0;
  for (let i = out; i < end; i++) m[i] = m[i]! + weight * m[(i + p) | 0]!;
}

/** out += a * b */
export function addProductInto(
  m: Float64Array,
  out: Address,
  a: Address,
  b: Address,
  length: number,
): void {
  const end = out + length;
  const p = (a - out) | 0;
  const q = (b - out) | 0;
  for (let i = out; i < end; i++) m[i] = m[i]! + m[(i + p) | 0]! * m[(i + q) | 0]!;
}

function one(m: Float64Array, out: Address, end: Address, p: number, q: number): void {
  for (let i = out; i < end; i++) m[i] = m[(i + p) | 0]! * m[(i + q) | 0]!;
}

function two(
  m: Float64Array,
  out: Address,
  end: Address,
  p: number,
  q: number,
  p1: number,
  q1: number,
): void {
  for (let i = out; i < end; i++) {
    m[i] = m[(i + p) | 0]! * m[(i + q) | 0]! + m[(i + p1) | 0]! * m[(i + q1) | 0]!;
  }
}

function three(
  m: Float64Array,
  out: Address,
  end: Address,
  p: number,
  q: number,
  p1: number,
  q1: number,
  p2: number,
  q2: number,
): void {
  for (let i = out; i < end; i++) {
    m[i] =
      m[(i + p) | 0]! * m[(i + q) | 0]! +
      m[(i + p1) | 0]! * m[(i + q1) | 0]! +
      m[(i + p2) | 0]! * m[(i + q2) | 0]!;
  }
}

function four(
  m: Float64Array,
  out: Address,
  end: Address,
  p: number,
  q: number,
  p1: number,
  q1: number,
  p2: number,
  q2: number,
  p3: number,
  q3: number,
): void {
  for (let i = out; i < end; i++) {
    m[i] =
      m[(i + p) | 0]! * m[(i + q) | 0]! +
      m[(i + p1) | 0]! * m[(i + q1) | 0]! +
      m[(i + p2) | 0]! * m[(i + q2) | 0]! +
      m[(i + p3) | 0]! * m[(i + q3) | 0]!;
  }
}

function oneAdding(
  m: Float64Array,
  out: Address,
  end: Address,
  p: number,
  q: number,
  s: number,
  weight: number,
): void {
  for (let i = out; i < end; i++) {
    const value = m[(i + p) | 0]! * m[(i + q) | 0]!;
    m[i] = value;
    m[(i + s) | 0] = m[(i + s) | 0]! + weight * value;
  }
}

function twoAdding(
  m: Float64Array,
  out: Address,
  end: Address,
  p: number,
  q: number,
  p1: number,
  q1: number,
  s: number,
  weight: number,
): void {
  for (let i = out; i < end; i++) {
    const value = m[(i + p) | 0]! * m[(i + q) | 0]! + m[(i + p1) | 0]! * m[(i + q1) | 0]!;
    m[i] = value;
    m[(i + s) | 0] = m[(i + s) | 0]! + weight * value;
  }
}

function threeAdding(
  m: Float64Array,
  out: Address,
  end: Address,
  p: number,
  q: number,
  p1: number,
  q1: number,
  p2: number,
  q2: number,
  s: number,
  weight: number,
): void {
  for (let i = out; i < end; i++) {
    const value =
      m[(i + p) | 0]! * m[(i + q) | 0]! +
      m[(i + p1) | 0]! * m[(i + q1) | 0]! +
      m[(i + p2) | 0]! * m[(i + q2) | 0]!;
    m[i] = value;
    m[(i + s) | 0] = m[(i + s) | 0]! + weight * value;
  }
}
