/**
 * Philox 4x32 with 10 rounds (Salmon, Moraes, Dror and Shaw 2011, Parallel random numbers:
 * as easy as 1, 2, 3): a random function of a counter, so that draw i of a stream is found
 * without making those before it. 32-bit integer arithmetic only: the same on every engine.
 */

/** out[0..3] = Philox of the counter c0..c3 under the key k0, k1 (all 32-bit words). */
export function philox(
  out: Uint32Array,
  c0: number,
  c1: number,
  c2: number,
  c3: number,
  k0: number,
  k1: number,
): void {
  for (let round = 0; round < 10; round++) {
    const high0 = multiplyHigh(0xd2511f53, c0);
    const low0 = Math.imul(0xd2511f53, c0);
    const high1 = multiplyHigh(0xcd9e8d57, c2);
    const low1 = Math.imul(0xcd9e8d57, c2);
    c0 = high1 ^ c1 ^ k0;
    c1 = low1;
    c2 = high0 ^ c3 ^ k1;
    c3 = low0;
    k0 = (k0 + 0x9e3779b9) | 0;
    k1 = (k1 + 0xbb67ae85) | 0;
  }
  out[0] = c0;
  out[1] = c1;
  out[2] = c2;
  out[3] = c3;
}

/** The upper 32 bits of the product of two unsigned 32-bit words. */
function multiplyHigh(a: number, b: number): number {
  const aLow = a & 0xffff;
  const aHigh = a >>> 16;
  const bLow = b & 0xffff;
  const bHigh = b >>> 16;
  const middle = aHigh * bLow + ((aLow * bLow) >>> 16);
  const carry = aLow * bHigh + (middle & 0xffff);
  return (aHigh * bHigh + (middle >>> 16) + (carry >>> 16)) | 0;
}
