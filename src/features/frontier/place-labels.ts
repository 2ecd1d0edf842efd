/** Finds each label of a chart a place beside its point that covers nothing else. */
import { textWidth } from '../../components/text-width.ts';

export interface ChartPoint {
  readonly id: string;
  readonly x: number;
  readonly y: number;
  readonly label: string;
}

export interface PlacedLabel {
  readonly id: string;
  readonly x: number;
  readonly y: number;
  readonly anchor: 'start' | 'end' | 'middle';
}

interface Box {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
}

const MARK = 10;
const LINE = 16;

/** Sides in the order tried: away from a frontier that rises to the right comes first. */
const SIDES = [
  { dx: 14, dy: 18, anchor: 'start' },
  { dx: -14, dy: -8, anchor: 'end' },
  { dx: 14, dy: 5, anchor: 'start' },
  { dx: -14, dy: 5, anchor: 'end' },
  { dx: 0, dy: 26, anchor: 'middle' },
  { dx: 0, dy: -16, anchor: 'middle' },
  { dx: 14, dy: -10, anchor: 'start' },
  { dx: -14, dy: 20, anchor: 'end' },
] as const;

/**
 * @param points in px
 * @param area what labels may cover
 * @returns null where some label finds no place: the caller then numbers the points
 */
export function placeLabels(points: readonly ChartPoint[], area: Box): PlacedLabel[] | null {
  const taken: Box[] = points.map(({ x, y }) => ({
    left: x - MARK,
    right: x + MARK,
    top: y - MARK,
    bottom: y + MARK,
  }));
  const placed: PlacedLabel[] = [];
  for (const point of points) {
    const width = textWidth(point.label);
    const found = SIDES.map((side) => candidate(point, side, width)).find(
      ({ box }) => inside(box, area) && !taken.some((other) => overlap(box, other)),
    );
    if (!found) return null;
    taken.push(found.box);
    placed.push(found.label);
  }
  return placed;
}

function candidate(point: ChartPoint, side: (typeof SIDES)[number], width: number) {
  const x = point.x + side.dx;
  const y = point.y + side.dy;
  const left = { start: x, end: x - width, middle: x - width / 2 }[side.anchor];
  const box = { left, right: left + width, top: y - LINE + 4, bottom: y + 4 };
  return { box, label: { id: point.id, x, y, anchor: side.anchor } };
}

function inside(box: Box, area: Box): boolean {
  return (
    box.left >= area.left &&
    box.right <= area.right &&
    box.top >= area.top &&
    box.bottom <= area.bottom
  );
}

function overlap(a: Box, b: Box): boolean {
  return a.left < b.right && b.left < a.right && a.top < b.bottom && b.top < a.bottom;
}
