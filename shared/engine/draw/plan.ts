/** The uniforms of each stream, by the sampling plan of the run. */
import type { SamplingSettings } from '../results.ts';
import { latinHypercube } from './latin-hypercube.ts';
import { scrambledSobol } from './scrambled-sobol.ts';
import { sobolDimensions } from './sobol-dimensions.ts';
import { streamOf, uniforms } from './stream.ts';

/** Gives the uniforms of the quantity of this name, for the draws of the block. */
export type Uniforms = (name: readonly string[]) => Float64Array;

/**
 * Draws `from`..`to` (end not included) of the run's plan; `names` are all that may be
 * asked for. What the Sobol plan has no dimension for is drawn by Latin hypercube.
 */
export function planUniforms(
  names: readonly (readonly string[])[],
  settings: SamplingSettings,
  from: number,
  to: number,
): Uniforms {
  const { seed, samples, plan } = settings;
  const dimensions = plan === 'sobol' ? sobolDimensions(names, samples) : new Map();
  return (name) => {
    const stream = streamOf(seed, ...name);
    if (plan === 'plain') return uniforms(stream, from, to);
    const dimension = dimensions.get(JSON.stringify(name));
    return dimension === undefined
      ? latinHypercube(stream, samples, from, to)
      : scrambledSobol(stream, dimension, from, to);
  };
}
