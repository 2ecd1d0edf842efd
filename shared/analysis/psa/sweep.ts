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
  /** Highest net benefit of the draw. */
  readonly top: Float64Array;
  /** How far below `top` still ties with it. */
  readonly slack: Float64Array;
  /** By strategy, how far it falls short of `top`: exactly 0 where it ties with it. */
  readonly losses: readonly Float64Array[];
  /** How many strategies tie with `top`. */
  readonly winners: Uint16Array;
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
    losses: draws.strategies.map(() => new Float64Array(count)),
    winners: new Uint16Array(count),
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
  scratch.winners.fill(0);
  const expectedLoss = draws.strategies.map((_, s) => fillLoss(draws, s, threshold, scratch));
  const bestLoss = scratch.losses[bestIndex] as Float64Array;
  return {
    threshold,
    meanNmb: rows.map(({ nmb }) => nmb),
    best: bestIndex,
    probability: scratch.losses.map((loss) => shareBest(loss, scratch.winners)),
    tiedShare: shareTied(scratch.winners),
    expectedLoss,
    lossSe: standardError(bestLoss, expectedLoss[bestIndex] as number),
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

/** Fills a strategy's losses, counts it where it ties with the highest; gives its mean loss. */
function fillLoss(draws: Draws, s: number, threshold: number, scratch: Scratch): number {
  const money = draws.cost[s] as Float64Array;
  const gain = draws.health[s] as Float64Array;
  const loss = scratch.losses[s] as Float64Array;
  const { top, slack, winners } = scratch;
  let total = 0;
  for (let i = 0; i < top.length; i++) {
    const paid = money[i] as number;
    const worth = threshold * (gain[i] as number);
    const short = (top[i] as number) - (worth - paid);
    // The tie of net-benefit.ts, written out for speed.
    const ties = short <= (slack[i] as number) || short <= TIE * (Math.abs(worth) + Math.abs(paid));
    if (ties) (winners[i] as number)++;
    const counted = ties ? 0 : short;
    loss[i] = counted;
    total += counted;
  }
  return total / top.length;
}

function shareBest(loss: Float64Array, winners: Uint16Array): number {
  let total = 0;
  for (let i = 0; i < loss.length; i++) {
    if (loss[i] === 0) total += 1 / (winners[i] as number);
  }
  return total / loss.length;
}

function shareTied(winners: Uint16Array): number {
  let tied = 0;
  for (let i = 0; i < winners.length; i++) {
    if ((winners[i] as number) > 1) tied++;
  }
  return tied / winners.length;
}
