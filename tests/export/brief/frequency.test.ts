import { expect, it } from 'vitest';
import { naturalFrequency } from '../../../shared/export/brief/frequency.ts';

it('writes a probability as so many of 100, and makes nothing certain by rounding', () => {
  const said = [0, 0.001, 0.004, 0.006, 0.65, 0.654, 0.995, 0.999, 1].map((probability) => {
    const { count, of, bound } = naturalFrequency(probability);
    return `${bound} ${count} of ${of}`;
  });
  expect(said).toEqual([
    'about 0 of 100',
    'below 1 of 100',
    'below 1 of 100',
    'about 1 of 100',
    'about 65 of 100',
    'about 65 of 100',
    'above 99 of 100',
    'above 99 of 100',
    'about 100 of 100',
  ]);
});
