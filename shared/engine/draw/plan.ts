/** The uniforms of each stream, by the sampling plan of the run. */
import type { SamplingSettings } from '../results.ts';
import { latinHypercube } from './latin-hypercube.ts';
import { type Stream, streamOf, uniforms } from './stream.ts';

/** Gives the uniforms of the quantity of this name, for the draws of the block. */
export type Uniforms = (name: readonly string[]) => Float64Array;

/** Draws `from`..`to` (end not included); `names` are all that may be asked for. */
export function planUniforms(
  _names: readonly (readonly string[])[],
  settings: SamplingSettings,
  from: number,
  to: number,
): Uniforms {
  const { seed, samples, plan } = settings;
  const make = (stream: Stream) =>
    plan === 'lhs' ? latinHypercube(stream, samples, from, to) : uniforms(stream, from, to);
  return (name) => make(streamOf(seed, ...name));
}
