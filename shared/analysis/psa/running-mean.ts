/**
 * How a mean settles as draws are added: cumulative means with their Monte Carlo
 * standard errors, thinned to so many points.
 */

export interface RunningMeanPoint {
  /** Number of draws that the mean is over. */
  readonly draws: number;
  readonly mean: number;
  /** Monte Carlo standard error of the mean; null for one draw. */
  readonly se: number | null;
}

/**
 * Points at even steps, the last over all draws; fewer where there are fewer draws.
 * Updated draw by draw as in Welford 1962, Technometrics 4:419-420 (from memory).
 * @param column values in the order drawn, such as incremental net benefits.
 * @param points 1 or more.
 */
export function runningMean(column: Float64Array, points: number): RunningMeanPoint[] {
  const kept: RunningMeanPoint[] = [];
  const steps = Math.min(points, column.length);
  let mean = 0;
  let squares = 0;
  for (let i = 0; i < column.length; i++) {
    const value = column[i] as number;
    const n = i + 1;
    const apart = value - mean;
    mean += apart / n;
    squares += apart * (value - mean);
    if (n === Math.round(((kept.length + 1) * column.length) / steps)) {
      kept.push({ draws: n, mean, se: n < 2 ? null : Math.sqrt(squares / (n - 1) / n) });
    }
  }
  return kept;
}
