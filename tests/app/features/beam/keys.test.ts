// The keys of a slider: WAI-ARIA Authoring Practices, slider pattern (from memory).
import { describe, expect, it } from 'vitest';
import { keyMove } from '../../../../src/features/beam/keys.ts';

const scale = { max: 3_500, step: 50 };
const press = (key: string, more = {}) => ({
  key,
  repeat: false,
  ctrlKey: false,
  metaKey: false,
  altKey: false,
  ...more,
});

describe('the keys of the poise', () => {
  it.each([
    ['ArrowRight', 1_550],
    ['ArrowUp', 1_550],
    ['ArrowLeft', 1_450],
    ['ArrowDown', 1_450],
    ['PageUp', 2_000],
    ['PageDown', 1_000],
    ['Home', 0],
    ['End', 3_500],
  ])('%s', (key, to) => {
    expect(keyMove(press(key), 1_500, scale)).toEqual({ to, starts: true });
  });

  it('are no others', () => {
    expect(keyMove(press('Tab'), 1_500, scale)).toBeNull();
    expect(keyMove(press('a'), 1_500, scale)).toBeNull();
  });

  it('leave the browser its own shortcuts', () => {
    expect(keyMove(press('ArrowLeft', { altKey: true }), 1_500, scale)).toBeNull();
    expect(keyMove(press('End', { ctrlKey: true }), 1_500, scale)).toBeNull();
  });

  it('make one movement while held down', () => {
    expect(keyMove(press('ArrowRight', { repeat: true }), 1_500, scale)?.starts).toBe(false);
  });
});
