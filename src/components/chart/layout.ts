/** Where things stand in a chart: its axes, its names, and how tall that makes it. */
import { type Axis, axis } from '../axis.ts';
import { textWidth } from '../text-width.ts';

export const TEXT = 14;
/** Numbers along an axis. */
export const TICK = { fill: 'var(--mute)', fontSize: TEXT };
/** Room above the plot for the title of the upright axis. */
export const TOP = 30;
/** Room below it for the numbers and the title of the level axis. */
export const BOTTOM = 48;
/** Height of a line of the key. */
export const KEY_LINE = 24;
const SWATCH = 42;

export interface EndLabel {
  readonly id: string;
  readonly name: string;
  readonly y: number;
}

/** Names beside the ends of lines, moved apart so that none covers another. */
export function spreadLabels(
  wanted: readonly EndLabel[],
  apart: number,
  lowest: number,
): EndLabel[] {
  const sorted = [...wanted].sort((a, b) => a.y - b.y);
  const placed: EndLabel[] = [];
  for (const label of sorted) {
    const floor = (placed.at(-1)?.y ?? Number.NEGATIVE_INFINITY) + apart;
    placed.push({ ...label, y: Math.max(label.y, floor) });
  }
  // What was pushed past the end goes back up, pushing others.
  for (let i = placed.length - 1, limit = lowest; i >= 0; i--) {
    const label = placed[i] as EndLabel;
    placed[i] = { ...label, y: Math.min(label.y, limit) };
    limit = (placed[i] as EndLabel).y - apart;
  }
  return placed;
}

/** Room that names beside line ends take, or null where a key below serves better. */
export function endRoom(names: readonly string[], width: number): number | null {
  const widest = Math.max(0, ...names.map((name) => textWidth(name)));
  return widest + 20 <= 0.34 * width ? widest + 20 : null;
}

export interface KeyPlace<T> {
  readonly item: T;
  readonly x: number;
  readonly y: number;
}

/** A key in rows, each name after its swatch; `height` is that of all rows. */
export function keyRows<T extends { readonly name: string }>(
  items: readonly T[],
  width: number,
): { readonly places: readonly KeyPlace<T>[]; readonly height: number } {
  let [x, row] = [0, 0];
  const places = items.map((item) => {
    const room = SWATCH + textWidth(item.name) + 18;
    if (x > 0 && x + room > width) [x, row] = [0, row + 1];
    const place = { item, x, y: row * KEY_LINE };
    x += room;
    return place;
  });
  return { places, height: items.length === 0 ? 0 : (row + 1) * KEY_LINE };
}

/** An axis that ends at its data: for shares and for time, which have no room beyond. */
export function exactAxis(low: number, high: number, most: number): Axis {
  // The room that `axis` adds at both ends is not wanted here.
  const inner = axis([low, high], Math.ceil(1.2 * most));
  const ticks = inner.ticks.filter((tick) => tick >= low && tick <= high);
  return { ...inner, low, high, ticks };
}

/** An upright axis for values that may not need the 0, with a little room. */
export function valueAxis(values: readonly number[], fromZero: boolean): Axis {
  const finite = values.filter(Number.isFinite);
  const all = fromZero || finite.length === 0 ? [0, ...finite] : finite;
  const found = axis(all, 6);
  // Nothing lies below 0: neither does the axis.
  if (!fromZero || Math.min(...all) < 0) return found;
  return { ...found, low: 0, ticks: found.ticks.filter((tick) => tick >= 0) };
}

/** Width that the numbers of an upright axis take. */
export function numbersWidth(ticks: readonly number[], write: (tick: number) => string): number {
  return Math.max(0, ...ticks.map((tick) => textWidth(write(tick)))) + 10;
}
