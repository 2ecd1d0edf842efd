/**
 * One walk over the draws at each threshold, from which the acceptability curves, the
 * frontier, the expected losses and the value of perfect information are all read.
 */
import { netBenefit } from '../net-benefit.ts';
import type { Option } from '../option.ts';
import { TIE } from '../tie.ts';
import { mean, standardError } from './column.ts';
import { type Draws, requireDraws } from './draws.ts';

export interface SweepPoint {
  readonly threshold: number;
  /** Mean net monetary benefit by strategy, money per person. */
  readonly meanNmb: readonly number[];
  /** Index of the strategy of the highest mean: of a tie, as `netBenefit` chooses. */
  readonly best: number;
  /** By strategy, the share of draws in which it is best; draws that tie are shared. */
  readonly probability: readonly number[];
  /** Share of draws in which two or more strategies are best together. */
  readonly tiedShare: number;
  /** By strategy, the mean of the highest net benefit of a draw less its own. */
  readonly expectedLoss: readonly number[];
  /** Monte Carlo standard error of the expected loss of `best`; null for one draw. */
  readonly lossSe: number | null;
}

export interface Sweep {
  readonly strategies: readonly string[];
  readonly draws: number;
  /** In the order of the thresholds given. */
  readonly points: readonly SweepPoint[];
}

/** Columns over the draws that are filled anew at each threshold. */
interface Scratch {
  readonly top: Float64Array;
  /** How far below `top` still ties with it. */
  readonly slack: Float64Array;
  readonly winners: Uint16Array;
  readonly loss: Float64Array;
}

/**
 * @param thresholds each 0 or more, finite.
 * @throws DocumentError see `requireDraws`
 */
export function sweep(draws: Draws, thresholds: readonly number[]): Sweep {
  const count = requireDraws(draws);
  const averages = draws.strategies.map((id, s) => ({
    id,
    cost: mean(draws.cost[s] as Float64Array),
    health: mean(draws.health[s] as Float64Array),
  }));
  const scratch = {
    top: new Float64Array(count),
    slack: new Float64Array(count),
    winners: new Uint16Array(count),
    loss: new Float64Array(count),
  };
  return {
    strategies: draws.strategies,
    draws: count,
    points: thresholds.map((threshold) => pointAt(draws, averages, threshold, scratch)),
  };
}

function pointAt(
  draws: Draws,
  averages: readonly Option[],
  threshold: number,
  scratch: Scratch,
): SweepPoint {
  const { rows, best } = netBenefit(averages, threshold);
  const bestIndex = rows.findIndex(({ id }) => id === best);
  fillHighest(draws, threshold, scratch);
  countWinners(draws, threshold, scratch);
  const probability = draws.strategies.map((_, s) => shareBest(draws, s, threshold, scratch));
  const expectedLoss = draws.strategies.map((_, s) => fillLoss(draws, s, threshold, scratch));
  fillLoss(draws, bestIndex, threshold, scratch);
  return {
    threshold,
    meanNmb: rows.map(({ nmb }) => nmb),
    best: bestIndex,
    probability,
    tiedShare: scratch.winners.reduce((n, k) => n + (k > 1 ? 1 : 0), 0) / scratch.top.length,
    expectedLoss,
    lossSe: standardError(scratch.loss, expectedLoss[bestIndex] as number),
  };
}

function fillHighest({ cost, health }: Draws, threshold: number, { top, slack }: Scratch): void {
  top.fill(Number.NEGATIVE_INFINITY);
  for (let s = 0; s < cost.length; s++) {
    const money = cost[s] as Float64Array;
    const gain = health[s] as Float64Array;
    for (let i = 0; i < top.length; i++) {
      const worth = threshold * (gain[i] as number);
      const nmb = worth - (money[i] as number);
      if (nmb > (top[i] as number)) {
        top[i] = nmb;
        slack[i] = TIE * (Math.abs(worth) + Math.abs(money[i] as number));
      }
    }
  }
}

function countWinners(draws: Draws, threshold: number, scratch: Scratch): void {
  scratch.winners.fill(0);
  for (let s = 0; s < draws.cost.length; s++) {
    for (let i = 0; i < scratch.top.length; i++) {
      if (wins(draws, s, i, threshold, scratch)) (scratch.winners[i] as number)++;
    }
  }
}

function shareBest(draws: Draws, s: number, threshold: number, scratch: Scratch): number {
  let total = 0;
  for (let i = 0; i < scratch.top.length; i++) {
    if (wins(draws, s, i, threshold, scratch)) total += 1 / (scratch.winners[i] as number);
  }
  return total / scratch.top.length;
}

/** The tie of net-benefit.ts, written out for speed. */
function wins(draws: Draws, s: number, i: number, threshold: number, scratch: Scratch): boolean {
  const money = (draws.cost[s] as Float64Array)[i] as number;
  const worth = threshold * ((draws.health[s] as Float64Array)[i] as number);
  const short = (scratch.top[i] as number) - (worth - money);
  if (short === 0 || short <= (scratch.slack[i] as number)) return true;
  return short <= TIE * (Math.abs(worth) + Math.abs(money));
}

/** Fills `loss` for a strategy and gives its mean: 0 or more, as no draw beats the highest. */
function fillLoss(draws: Draws, s: number, threshold: number, { top, loss }: Scratch): number {
  const money = draws.cost[s] as Float64Array;
  const gain = draws.health[s] as Float64Array;
  for (let i = 0; i < top.length; i++) {
    loss[i] = (top[i] as number) - (threshold * (gain[i] as number) - (money[i] as number));
  }
  return Math.max(0, mean(loss));
}
