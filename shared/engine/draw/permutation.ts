/**
 * A random permutation of 0..n-1 that can be asked for one place at a time, so that a block
 * of a plan does not need the blocks before it: a Feistel network (Luby and Rackoff 1988)
 * over the next even number of bits, walked until it falls inside (Black and Rogaway 2002).
 * The rounds use the 32-bit finaliser of MurmurHash3 (Appleby).
 */
import { mix } from './mix.ts';
import { LANES, type Stream, wordsAt } from './stream.ts';

const ROUNDS = 8;

/** The permutation of 0..n-1 that belongs to the stream; `n` from 1 to 2^30. */
export function permutationOf(stream: Stream, n: number): (place: number) => number {
  const keys = roundKeys(stream, n);
  const half = Math.max(1, Math.ceil((32 - Math.clz32(n - 1)) / 2));
  return (place) => {
    let value = place;
    do value = encrypt(value, half, keys);
    while (value >= n);
    return value;
  };
}

/** Keys depend on n too, so that plans of different lengths are shuffled apart. */
function roundKeys(stream: Stream, n: number): Uint32Array {
  const keys = new Uint32Array(ROUNDS);
  for (let i = 0; i < ROUNDS / 4; i++) {
    wordsAt(stream, LANES.permutation + (i << 8), n, keys.subarray(4 * i, 4 * i + 4));
  }
  return keys;
}

function encrypt(value: number, half: number, keys: Uint32Array): number {
  const mask = (1 << half) - 1;
  let left = value >>> half;
  let right = value & mask;
  for (let round = 0; round < ROUNDS; round++) {
    const next = left ^ (mix(right ^ (keys[round] ?? 0)) & mask);
    left = right;
    right = next;
  }
  return (left << half) | right;
}
