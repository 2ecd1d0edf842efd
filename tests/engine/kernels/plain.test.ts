import { describe, expect, it } from 'vitest';
import { plainKernels } from '../../../shared/engine/kernels/plain.ts';
import { kernelSuite } from './suite.ts';

describe('plain kernels', () => {
  kernelSuite(plainKernels);

  it('keep the memory they were given', () => {
    const memory = new Float64Array(4);
    expect(plainKernels(memory).memory).toBe(memory);
    expect(memory).toHaveLength(4);
  });
});
