import { describe, expect, it } from 'vitest';
import {
  beamLayout,
  HOOK_DROP,
  keepInside,
  PLATE_HEIGHT,
  POISE_DROP,
} from '../../../../src/features/beam/layout.ts';

const segments = [
  { strategy: 'now', tied: [], from: 0, to: 507 },
  { strategy: 'register', tied: [], from: 507, to: 1_046 },
  { strategy: 'school', tied: [], from: 1_046, to: 3_500 },
];
const names = new Map([
  ['now', 'Care as now'],
  ['register', 'Register, reminders'],
  ['school', 'Nurses at school'],
]);
const loads = { plate: { width: 72, lifts: false }, poiseWidth: 72 };
const at = (width: number, more = loads) => beamLayout(width, 3_500, segments, names, more);

describe('the beam on a screen', () => {
  it.each([328, 360, 704, 1_140])('of %d px keeps everything inside', (width) => {
    const layout = at(width);
    expect(layout.hookX - loads.plate.width / 2).toBeGreaterThanOrEqual(0);
    expect(layout.xOf(3_500) + loads.poiseWidth / 2).toBeLessThanOrEqual(width);
  });

  it('reads a place along the arm back as the threshold that stands there', () => {
    const layout = at(704);
    for (const threshold of [0, 507, 1_500, 3_500]) {
      expect(layout.thresholdAt(layout.xOf(threshold))).toBeCloseTo(threshold, 9);
    }
  });

  it('writes names along the arm where all fit, and leaves them to a key where not', () => {
    expect(at(1_140).namesFit).toBe(true);
    expect(at(328).namesFit).toBe(false);
  });

  it('keeps the load clear of the poise and of the stand', () => {
    expect(POISE_DROP).toBeGreaterThan(HOOK_DROP + PLATE_HEIGHT);
    const { hookX, fulcrum } = at(328);
    expect(hookX + loads.plate.width / 2).toBeLessThan(fulcrum.x - 8);
  });

  it('leans as far on a phone as its height allows: less in px, more in degrees', () => {
    expect(at(328).maxAngle).toBeGreaterThan(at(1_140).maxAngle);
    expect(at(328).maxAngle).toBeLessThan(10);
  });

  it('makes room above for a load that lifts', () => {
    const lifting = at(328, { ...loads, plate: { width: 72, lifts: true } });
    expect(lifting.fulcrum.y).toBeGreaterThan(at(328).fulcrum.y);
    expect(lifting.labelsFrom).toBeGreaterThan(lifting.hookX + 36);
  });
});

describe('words at a place', () => {
  it('stand there where they can', () => {
    expect(keepInside(200, 100, 400)).toBe(200);
  });

  it('move in from the edges, and from what stands beside them', () => {
    expect(keepInside(10, 100, 400)).toBe(52);
    expect(keepInside(395, 100, 400)).toBe(348);
    expect(keepInside(10, 100, 400, 80)).toBe(132);
  });
});
