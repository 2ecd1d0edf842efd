/**
 * Which Sobol dimension each stream gets: docs/decisions/004. A stream goes where its own
 * name sends it; only where two names ask for the same place does the one with the later
 * rank move on, so that adding a parameter seldom changes the draws of another.
 */
import { SOBOL_DIMENSIONS, sobolDirections } from './sobol.ts';
import { type Stream, streamOf, wordsAt } from './stream.ts';

/** Ranks and places do not depend on the seed of the run. */
const NAMES_SEED = 0;
const TRIES = 64;
/** Share of a power of 2 that serves for the whole: 1,000 draws for 1,024. */
const NEARLY = 0.95;

/**
 * The dimension of each name, by its JSON. Names beyond the number of dimensions that
 * `samples` points can tell apart get none.
 */
export function sobolDimensions(
  names: readonly (readonly string[])[],
  samples: number,
): Map<string, number> {
  const places = distinctDimensions(samples);
  const free = new Set(places.keys());
  const streams = names.map((name) => streamOf(NAMES_SEED, 'dimension', ...name));
  const result = new Map<string, number>();
  for (const stream of streams.sort(byRank)) {
    const place = findPlace(stream, free, places.length);
    if (place === undefined) break;
    free.delete(place);
    result.set(JSON.stringify(stream.name.slice(1)), places[place] ?? 0);
  }
  return result;
}

const cache = new Map<number, readonly number[]>();

/**
 * Dimensions that `samples` points can tell apart: within 2^b points, the largest such that
 * `samples` falls short of them by a twentieth at most, no combination of up to 4 binary
 * digits of two of them is the same. One of k digits would correlate them by 3 / 2^k.
 */
export function distinctDimensions(samples: number): readonly number[] {
  const bits = 31 - Math.clz32(Math.max(samples / NEARLY, 1));
  const known = cache.get(bits) ?? findDistinct(bits);
  cache.set(bits, known);
  return known;
}

function findDistinct(bits: number): number[] {
  const [ones, twos, threes] = [new Set<number>(), new Set<number>(), new Set<number>()];
  const result: number[] = [];
  for (let dimension = 0; dimension < SOBOL_DIMENSIONS; dimension++) {
    const digits = firstDigits(dimension, bits);
    const [one, two, three] = [span(digits, 1), span(digits, 2), span(digits, 3)];
    if (meet(one, threes) || meet(two, twos) || meet(three, ones)) continue;
    result.push(dimension);
    for (const digit of one) ones.add(digit);
    for (const digit of two) twos.add(digit);
    for (const digit of three) threes.add(digit);
  }
  return result;
}

/** For each of the first 3 binary digits, which of the index's `bits` lowest bits flip it. */
function firstDigits(dimension: number, bits: number): number[] {
  const directions = sobolDirections(dimension).subarray(0, bits);
  return [31, 30, 29].map((shift) =>
    directions.reduce((digit, direction, k) => digit | (((direction >>> shift) & 1) << k), 0),
  );
}

/** All combinations (exclusive or) of the first `count` digits, but the empty one. */
function span(digits: readonly number[], count: number): number[] {
  let result = [0];
  for (const digit of digits.slice(0, count)) {
    result = [...result, ...result.map((other) => other ^ digit)];
  }
  return result.slice(1);
}

function meet(some: readonly number[], others: ReadonlySet<number>): boolean {
  return some.some((digit) => others.has(digit));
}

function findPlace(stream: Stream, free: ReadonlySet<number>, places: number): number | undefined {
  const words = new Uint32Array(4);
  for (let i = 0; i < TRIES; i++) {
    wordsAt(stream, 0, i, words);
    const place = (words[0] ?? 0) % places;
    if (free.has(place)) return place;
  }
  for (const place of free) return place;
  return undefined;
}

function byRank(a: Stream, b: Stream): number {
  return a.words[0] - b.words[0] || a.words[1] - b.words[1];
}
