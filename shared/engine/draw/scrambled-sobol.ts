/**
 * A scrambled Sobol coordinate for each stream: Owen's nested uniform scrambling (Owen 1995,
 * Randomly permuted (t, m, s)-nets) keeps the sequence's evenness and makes each point
 * uniform, so that means are unbiased.
 */
import { mix } from './mix.ts';
import { sobolDirections, sobolPoint } from './sobol.ts';
import { LANES, type Stream, uniforms, wordsAt } from './stream.ts';

/** Points `from`..`to` (end not included) of dimension `dimension`, strictly inside (0, 1). */
export function scrambledSobol(
  stream: Stream,
  dimension: number,
  from: number,
  to: number,
): Float64Array {
  const directions = sobolDirections(dimension);
  const key = scrambleKey(stream);
  return uniforms(stream, from, to).map((jitter, i) => {
    const word = scramble(sobolPoint(directions, from + i), key);
    // 20 bits of jitter below the 32 of the word keep the sum exact.
    return (word + (Math.floor(jitter * 2 ** 20) + 0.5) / 2 ** 20) / 2 ** 32;
  });
}

function scrambleKey(stream: Stream): Uint32Array {
  const words = new Uint32Array(4);
  wordsAt(stream, LANES.scramble, 0, words);
  return words;
}

/** Flips each binary digit or not, by a random function of the digits above it. */
function scramble(word: number, key: Uint32Array): number {
  const [first = 0, second = 0] = key;
  let flips = 0;
  for (let digit = 0; digit < 32; digit++) {
    const above = digit === 0 ? 0 : word >>> (32 - digit);
    const random = mix(mix(above ^ first) + Math.imul(digit, 0x9e3779b9) + second);
    flips |= (random & 1) << (31 - digit);
  }
  return (word ^ flips) >>> 0;
}
