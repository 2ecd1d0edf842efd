/**
 * The law of the lever for the beam. On the hook, at unit distance, hangs what the
 * strategy costs more than the one it is weighed against; on the poise hangs the health
 * it adds, at a distance of the threshold. The difference of the two moments is the
 * incremental net monetary benefit.
 */
import { frontierRows, type IncrementalRow } from './incremental.ts';
import { difference, TIE } from './tie.ts';

export interface Lever {
  /** Threshold at which the arm lies level: the pair's ratio; null where none or all do. */
  readonly levelAt: number | null;
  /** What is on the hook: more cost loads it, savings lift it. */
  readonly hook: 'load' | 'lift' | 'nothing';
  readonly poise: 'gain' | 'loss' | 'nothing';
  readonly word:
    | 'level'
    /** Net benefit above 0. */
    | 'tipsToPoise'
    /** Net benefit below 0. */
    | 'tipsToHook'
    /** Costs more and gains nothing or less (or saves nothing and loses): level nowhere. */
    | 'cannotLevel'
    /** Saves and gains: down at the poise wherever that stands. */
    | 'alwaysTipsToPoise'
    /** Same cost, same health: level wherever the poise stands. */
    | 'noDifference';
  /** -1 (hook down) to 1 (poise down), never reaching either; 0 exactly at `levelAt`. */
  readonly tilt: number;
}

export interface Pair {
  /** Money per person that the strategy costs more. */
  readonly incrementalCost: number;
  /** Units of health per person that it gains more. */
  readonly incrementalHealth: number;
}

/**
 * @param threshold where the poise stands; 0 or more, finite.
 * @param scale net benefit at which the arm has tipped half way, above 0; by default
 *   the size of the load, or of the health at a threshold of 1 where there is no load.
 */
export function lever(pair: Pair, threshold: number, scale = defaultScale(pair)): Lever {
  const { incrementalCost: cost, incrementalHealth: health } = pair;
  const tilt = tiltOf(threshold * health, cost, scale);
  const levelAt = levelOf(cost, health);
  return {
    levelAt,
    hook: cost > 0 ? 'load' : cost < 0 ? 'lift' : 'nothing',
    poise: health > 0 ? 'gain' : health < 0 ? 'loss' : 'nothing',
    word: wordFor(pair, levelAt, tilt),
    tilt,
  };
}

/** The two strategies that the beam weighs. */
export interface WeighedPair extends Pair {
  readonly strategy: string;
  readonly against: string;
}

/**
 * The strategy best at the poise against its next cheaper neighbour on the frontier;
 * the cheapest against the next dearer one; one that is alone there against the first
 * of the others by cost, and one that is not there against the cheapest. Null where
 * there is no other.
 */
export function defaultPair(rows: readonly IncrementalRow[], best: string): WeighedPair | null {
  const strategy = rows.find(({ id }) => id === best);
  if (strategy === undefined) return null;
  const frontier = frontierRows(rows);
  const place = frontier.findIndex(({ id }) => id === (strategy.tiedWith ?? best));
  const others = rows.filter((row) => row.id !== best);
  const against =
    frontier[place - 1] ??
    frontier[place + 1] ??
    others.find((row) => row.tiedWith === null) ??
    others[0];
  if (against === undefined || against.id === best) return null;
  return {
    strategy: best,
    against: against.id,
    incrementalCost: difference(strategy.cost, against.cost),
    incrementalHealth: difference(strategy.health, against.health),
  };
}

function defaultScale({ incrementalCost, incrementalHealth }: Pair): number {
  return Math.abs(incrementalCost) || Math.abs(incrementalHealth) || 1;
}

/** Rises with net benefit m as m / (|m| + scale); sums that only rounding parts are level. */
function tiltOf(gain: number, cost: number, scale: number): number {
  const moment = gain - cost;
  if (Math.abs(moment) <= TIE * (Math.abs(gain) + Math.abs(cost))) return 0;
  return moment / (Math.abs(moment) + scale);
}

function levelOf(cost: number, health: number): number | null {
  if (health === 0) return null;
  const ratio = cost / health;
  return ratio >= 0 && Number.isFinite(ratio) ? Math.abs(ratio) : null;
}

function wordFor(pair: Pair, levelAt: number | null, tilt: number): Lever['word'] {
  const { incrementalCost: cost, incrementalHealth: health } = pair;
  if (cost === 0 && health === 0) return 'noDifference';
  if (levelAt === null) return cost > 0 ? 'cannotLevel' : 'alwaysTipsToPoise';
  if (tilt === 0) return 'level';
  return tilt > 0 ? 'tipsToPoise' : 'tipsToHook';
}
