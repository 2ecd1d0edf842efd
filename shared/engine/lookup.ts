/** Reading a table: one or two keys, by step or by straight lines; the ends hold. */
import type { Table } from '../model/document.ts';

export type Lookup = (...keys: number[]) => number;

/** Index of the last point not above the key; 0 below the first. NaN stays NaN in `position`. */
function below(points: readonly number[], key: number): number {
  let low = 0;
  let high = points.length - 1;
  while (low < high) {
    const middle = (low + high + 1) >> 1;
    if (points[middle]! <= key) low = middle;
    else high = middle - 1;
  }
  return low;
}

/** Where a key falls: the point before it, and how far on to the next (0 to 1). */
export function position(
  points: readonly number[],
  key: number,
  linear: boolean,
): [number, number] {
  if (Number.isNaN(key)) return [0, Number.NaN];
  const index = below(points, key);
  const next = points[index + 1];
  if (!linear || next === undefined || key <= points[index]!) return [index, 0];
  return [index, (key - points[index]!) / (next - points[index]!)];
}

function between(low: number, high: number | undefined, part: number): number {
  return part === 0 ? low : low + part * ((high ?? low) - low);
}

/** The table as a function of its keys, in the order that the table lists them. */
export function lookupOf(table: Table): Lookup {
  const linear = table.interpolation === 'linear';
  const { values } = table;
  const first = table.keys[0]!.points;
  const second = table.keys[1]?.points;
  const alongSecond = (row: number, key: number) => {
    if (!second) return values[row] as number;
    const [index, part] = position(second, key, linear);
    const at = row * second.length + index;
    return between(values[at] as number, values[at + 1], part);
  };
  return (key, other = 0) => {
    const [index, part] = position(first, key, linear);
    const low = alongSecond(index, other);
    return part === 0 ? low : between(low, alongSecond(index + 1, other), part);
  };
}
