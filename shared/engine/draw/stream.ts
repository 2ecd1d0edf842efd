/**
 * One random stream a quantity. A stream is a Philox key and half a counter, taken from the
 * SHA-256 of the seed and the quantity's name: streams of different names do not meet, and a
 * stream does not change when other names come or go.
 */
import { sha256 } from '@noble/hashes/sha2.js';
import { utf8ToBytes } from '@noble/hashes/utils.js';
import { philox } from './philox.ts';

export interface Stream {
  /** Ids that make the stream's name, for example ['parameter', 'p1']. */
  readonly name: readonly string[];
  /** Key words k0, k1 and counter words c2, c3. */
  readonly words: readonly [number, number, number, number];
}

/** What a stream's words are used for; keeps the uses apart (counter word 1). */
export const LANES = { uniforms: 0, permutation: 1, scramble: 2 } as const;

/** `seed`: unsigned 32-bit integer. */
export function streamOf(seed: number, ...name: string[]): Stream {
  const digest = sha256(utf8ToBytes(JSON.stringify([seed, ...name])));
  const view = new DataView(digest.buffer, digest.byteOffset, digest.byteLength);
  const word = (i: number) => view.getUint32(4 * i, true);
  return { name, words: [word(0), word(1), word(2), word(3)] };
}

/** Four random words: number `index` of a lane of the stream. */
export function wordsAt(stream: Stream, lane: number, index: number, out: Uint32Array): void {
  const [k0, k1, c2, c3] = stream.words;
  philox(out, index | 0, lane, c2, c3, k0, k1);
}

/**
 * Uniform strictly inside (0, 1) from two words: 52 bits and a half, so that it is exact,
 * never 0 or 1, and u and 1 - u are alike.
 */
export function uniformOf(high: number, low: number): number {
  return ((high >>> 0) * 0x100000 + (low >>> 12) + 0.5) / 2 ** 52;
}

/** Uniforms number `from`..`to` (end not included) of the stream. */
export function uniforms(stream: Stream, from: number, to: number): Float64Array {
  const result = new Float64Array(to - from);
  const words = new Uint32Array(4);
  for (let i = from; i < to; i++) {
    const odd = i & 1;
    if (!odd || i === from) wordsAt(stream, LANES.uniforms, i >>> 1, words);
    result[i - from] = odd
      ? uniformOf(words[2] ?? 0, words[3] ?? 0)
      : uniformOf(words[0] ?? 0, words[1] ?? 0);
  }
  return result;
}
