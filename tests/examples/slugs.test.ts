import { readdirSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { EXAMPLE_SLUGS } from '../../shared/examples/slugs.ts';
import { EXAMPLES, exampleOf } from './load.ts';

describe('slugs of the examples', () => {
  it('name every document in the folder and no other', () => {
    const files = readdirSync(EXAMPLES).filter((name) => name.endsWith('.json'));
    expect(files.sort()).toEqual(EXAMPLE_SLUGS.map((slug) => `${slug}.json`).sort());
  });

  it.each(EXAMPLE_SLUGS)('%s is the id of its document', (slug) => {
    expect(exampleOf(slug).id).toBe(slug);
  });
});
