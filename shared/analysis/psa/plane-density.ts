/** The clouds of the plane counted into a grid, to be drawn without a mark a draw. */
import type { PlaneCloud } from './plane.ts';

/** What the grid covers: units of health (across) and money (up). */
export interface PlaneExtent {
  readonly health: readonly [number, number];
  readonly cost: readonly [number, number];
}

export interface PlaneDensity {
  readonly strategy: string;
  /** Draws in each cell, row by row from the lowest cost, each from the least health. */
  readonly counts: Uint32Array;
  readonly highest: number;
  /** Draws that the extent leaves out. */
  readonly outside: number;
}

/** The least extent that holds every draw of every cloud and the origin. */
export function planeExtent(clouds: readonly PlaneCloud[]): PlaneExtent {
  return {
    health: range(clouds.map(({ health }) => health)),
    cost: range(clouds.map(({ cost }) => cost)),
  };
}

/** @param columns, rows of the grid, each 1 or more. */
export function planeDensity(
  cloud: PlaneCloud,
  extent: PlaneExtent,
  columns: number,
  rows: number,
): PlaneDensity {
  const counts = new Uint32Array(columns * rows);
  let outside = 0;
  for (let i = 0; i < cloud.health.length; i++) {
    const column = cellOf(cloud.health[i] as number, extent.health, columns);
    const row = cellOf(cloud.cost[i] as number, extent.cost, rows);
    if (column < 0 || row < 0) outside++;
    else (counts[row * columns + column] as number)++;
  }
  const highest = counts.reduce((most, count) => Math.max(most, count), 0);
  return { strategy: cloud.strategy, counts, highest, outside };
}

/** Cells hold their lower edge; the last holds its upper edge too. -1 outside. */
function cellOf(value: number, [low, high]: readonly [number, number], cells: number): number {
  if (value < low || value > high) return -1;
  if (high === low) return 0;
  return Math.min(cells - 1, Math.floor(((value - low) / (high - low)) * cells));
}

function range(columns: readonly Float64Array[]): [number, number] {
  let low = 0;
  let high = 0;
  for (const column of columns) {
    for (let i = 0; i < column.length; i++) {
      low = Math.min(low, column[i] as number);
      high = Math.max(high, column[i] as number);
    }
  }
  return [low, high];
}
