/**
 * A test fails when the code under it writes console errors or warnings it did not
 * expect. A test that expects them replaces the method itself with `vi.spyOn`.
 */
import { afterEach, beforeEach, expect } from 'vitest';

const METHODS = ['error', 'warn'] as const;
let written: string[] = [];
let originals: Pick<Console, 'error' | 'warn'>;

beforeEach(() => {
  written = [];
  originals = { error: console.error, warn: console.warn };
  for (const method of METHODS) {
    console[method] = (...args: unknown[]) => {
      written.push(`console.${method}: ${args.map(String).join(' ')}`);
    };
  }
});

afterEach(() => {
  Object.assign(console, originals);
  expect(written, 'unexpected console output').toEqual([]);
});
