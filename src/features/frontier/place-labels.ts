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

const MARK = 9;
const LINE = 16;
const LINE_STEP = 6;

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
  { dx: 0, dy: -26, anchor: 'middle' },
  { dx: 0, dy: 36, anchor: 'middle' },
] as const;

/**
 * @param points in px
 * @param line corners of the frontier, which no label may cross either
 * @param area what labels may cover
 * @returns null where some label finds no place: the caller then writes a key
 */
export function placeLabels(
  points: readonly ChartPoint[],
  line: readonly { readonly x: number; readonly y: number }[],
  area: Box,
): PlacedLabel[] | null {
  const marks = points.map(({ x, y }) => ({ x, y, size: MARK }));
  const taken: Box[] = [...marks, ...along(line)].map(({ x, y, size }) => ({
    left: x - size,
    right: x + size,
    top: y - size,
    bottom: y + size,
  }));
  const placed: PlacedLabel[] = [];
  for (const point of points) {
    const width = textWidth(point.label);
    const found = SIDES.map((side) => candidate(point, side, width, area)).find(
      ({ box }) => inside(box, area) && !taken.some((other) => overlap(box, other)),
    );
    if (!found) return null;
    taken.push(found.box);
    placed.push(found.label);
  }
  return placed;
}

/** Points along a line, close enough together that no label slips through. */
function along(line: readonly { readonly x: number; readonly y: number }[]) {
  return line.slice(1).flatMap((to, i) => {
    const from = line[i] ?? to;
    const steps = Math.ceil(Math.hypot(to.x - from.x, to.y - from.y) / LINE_STEP);
    return Array.from({ length: steps }, (_, k) => ({
      x: from.x + ((to.x - from.x) * k) / steps,
      y: from.y + ((to.y - from.y) * k) / steps,
      size: 3,
    }));
  });
}

function candidate(point: ChartPoint, side: (typeof SIDES)[number], width: number, area: Box) {
  const half = width / 2;
  const aside = point.x + side.dx;
  // One above or below may shift along, so as not to stick out.
  const kept = Math.min(area.right - half, Math.max(area.left + half, aside));
  const x = side.anchor === 'middle' ? kept : aside;
  const y = point.y + side.dy;
  const left = { start: x, end: x - width, middle: x - half }[side.anchor];
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
