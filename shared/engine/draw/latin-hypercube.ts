/**
 * Latin hypercube sampling (McKay, Beckman and Conover 1979, Technometrics 21:239-245):
 * (0, 1) is cut into as many strata as draws, each is hit once, in an order shuffled for
 * each stream, at a random place within.
 */
import { permutationOf } from './permutation.ts';
import { type Stream, uniforms } from './stream.ts';

/** Points `from`..`to` (end not included) of the plan of `samples` points. */
export function latinHypercube(
  stream: Stream,
  samples: number,
  from: number,
  to: number,
): Float64Array {
  const stratum = permutationOf(stream, samples);
  return uniforms(stream, from, to).map((jitter, i) => (stratum(from + i) + jitter) / samples);
}
