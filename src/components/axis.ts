/** Round numbers for an axis that spans the data with a little room at both ends. */

export interface Axis {
  readonly low: number;
  readonly high: number;
  readonly step: number;
  readonly ticks: readonly number[];
  /** Decimals that tell one tick from the next. */
  readonly decimals: number;
}

const ROOM = 0.08;

/** @param values 1 or more finite numbers @param most ticks wanted at most, 2 or more */
export function axis(values: readonly number[], most: number): Axis {
  const least = Math.min(...values);
  const largest = Math.max(...values);
  const span = largest - least || Math.abs(largest) || 1;
  const step = niceStep((span * (1 + 2 * ROOM)) / Math.max(1, most - 1));
  const low = Math.floor((least - ROOM * span) / step) * step;
  const high = Math.ceil((largest + ROOM * span) / step) * step;
  const count = Math.round((high - low) / step);
  return {
    low,
    high,
    step,
    ticks: Array.from({ length: count + 1 }, (_, i) => Number((low + i * step).toPrecision(12))),
    decimals: Math.max(0, -Math.floor(Math.log10(step) + 1e-9) + (isQuarter(step) ? 1 : 0)),
  };
}

function niceStep(rough: number): number {
  const power = 10 ** Math.floor(Math.log10(rough));
  const step = [1, 2, 2.5, 5, 10].find((each) => each * power >= rough * (1 - 1e-9)) ?? 10;
  return step * power;
}

/** Steps of 2.5 need one decimal more than their size says. */
function isQuarter(step: number): boolean {
  const lead = step / 10 ** Math.floor(Math.log10(step) + 1e-9);
  return Math.abs(lead - 2.5) < 1e-6;
}
