import { expect, it } from 'vitest';
import { textWidth } from '../../../../src/components/text-width.ts';
import { type PlacedLabel, placeLabels } from '../../../../src/features/frontier/place-labels.ts';

const area = { left: 40, right: 460, top: 20, bottom: 250 };
const points = [
  { id: 'a', x: 80, y: 230, label: 'Care as now' },
  { id: 'b', x: 180, y: 208, label: 'Register, reminders' },
  { id: 'c', x: 390, y: 100, label: 'Nurses at school' },
  { id: 'd', x: 300, y: 80, label: 'Clinic injections' },
];
const line = points.slice(0, 3);

function boxOf({ id, x, y, anchor }: PlacedLabel) {
  const width = textWidth(points.find((point) => point.id === id)?.label ?? '');
  const left = { start: x, end: x - width, middle: x - width / 2 }[anchor];
  return { left, right: left + width, top: y - 12, bottom: y + 4 };
}

it('finds each label a place of its own inside the chart', () => {
  const boxes = (placeLabels(points, line, area) ?? []).map(boxOf);
  expect(boxes).toHaveLength(4);
  for (const [i, a] of boxes.entries()) {
    expect(a.left).toBeGreaterThanOrEqual(area.left);
    expect(a.right).toBeLessThanOrEqual(area.right);
    for (const b of boxes.slice(i + 1)) {
      const apart =
        a.right <= b.left || b.right <= a.left || a.bottom <= b.top || b.bottom <= a.top;
      expect(apart).toBe(true);
    }
  }
});

it('does not write across the frontier', () => {
  const boxes = (placeLabels(points, line, area) ?? []).map(boxOf);
  // A point half way along the second stretch.
  const [x, y] = [285, 154];
  const covers = boxes.some(
    (box) => box.left < x && x < box.right && box.top < y && y < box.bottom,
  );
  expect(covers).toBe(false);
});

it('says where there is no room', () => {
  const narrow = { ...area, right: 130 };
  expect(
    placeLabels([{ id: 'a', x: 80, y: 100, label: 'A name too long for it' }], [], narrow),
  ).toBe(null);
});
