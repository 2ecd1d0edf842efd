/**
 * Known answers of Philox 4x32-10: the kat_vectors file that its authors publish with
 * Random123 (Salmon et al. 2011).
 */
import { expect, it } from 'vitest';
import { philox } from '../../../shared/engine/draw/philox.ts';

const KNOWN = [
  [
    '00000000 00000000 00000000 00000000',
    '00000000 00000000',
    '6627e8d5 e169c58d bc57ac4c 9b00dbd8',
  ],
  [
    'ffffffff ffffffff ffffffff ffffffff',
    'ffffffff ffffffff',
    '408f276d 41c83b0e a20bc7c6 6d5451fd',
  ],
  [
    '243f6a88 85a308d3 13198a2e 03707344',
    'a4093822 299f31d0',
    'd16cfe09 94fdcceb 5001e420 24126ea1',
  ],
] as const;

const words = (hex: string) => hex.split(' ').map((word) => Number.parseInt(word, 16));

it.each(KNOWN)('counter %s, key %s', (counter, key, answer) => {
  const [c0 = 0, c1 = 0, c2 = 0, c3 = 0] = words(counter);
  const [k0 = 0, k1 = 0] = words(key);
  const out = new Uint32Array(4);
  philox(out, c0, c1, c2, c3, k0, k1);
  expect([...out]).toEqual(words(answer));
});
