import { render } from '@testing-library/react';
import { expect, it } from 'vitest';
import { QrCode } from '../../../../../src/routes/appraisal/brief/qr-code.tsx';

/** Dark modules by place, the quiet zone counted. */
function drawn(text: string) {
  const { container } = render(<QrCode text={text} label="A code" />);
  const path = container.querySelector('path')?.getAttribute('d') ?? '';
  const dark = new Set([...path.matchAll(/M(\d+) (\d+)h1v1h-1z/g)].map(([, x, y]) => `${x} ${y}`));
  const size = Number(container.querySelector('svg')?.getAttribute('viewBox')?.split(' ')[2]);
  return { dark, size };
}

// ISO/IEC 18004: a finder pattern of 7 modules in three corners, a quiet zone of 4, and a
// side of 17 + 4 x version modules (from memory).
it('draws a code with its finder patterns and its quiet zone', () => {
  const { dark, size } = drawn('document 0123456789abcdef');
  expect((size - 8 - 17) % 4).toBe(0);
  for (const [left, top] of [
    [4, 4],
    [size - 11, 4],
    [4, size - 11],
  ] as const) {
    const ring = [0, 1, 2, 3, 4, 5, 6].map((step) => dark.has(`${left + step} ${top}`));
    expect(ring).toEqual([true, true, true, true, true, true, true]);
    expect(dark.has(`${left + 1} ${top + 1}`)).toBe(false);
    expect(dark.has(`${left + 3} ${top + 3}`)).toBe(true);
  }
  expect([...dark].some((place) => place.split(' ').some((at) => Number(at) < 4))).toBe(false);
});

it('says another text otherwise', () => {
  expect(drawn('one').dark).not.toEqual(drawn('two').dark);
});
