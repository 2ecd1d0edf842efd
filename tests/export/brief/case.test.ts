import { expect, it } from 'vitest';
import { briefCase } from '../../../shared/export/brief/case.ts';
import { given } from './given.ts';

it('reads the base case once for all parts', () => {
  const { document, base } = given({ a: [100, 10], b: [300, 11], c: [400, 10.5] });
  expect(briefCase(document, base, 250).best).toBe('b');
  expect(briefCase(document, base, 150).best).toBe('a');
  expect(briefCase(document, base, 150).rows.map(({ status }) => status)).toEqual([
    'reference',
    'frontier',
    'dominated',
  ]);
});
