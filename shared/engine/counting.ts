/**
 * How much a payoff counts in each cycle, discount factor included.
 *
 * A state payoff of cycle c counts `start[c]` times the occupancy at the start of
 * the cycle and `end[c]` times that at its end; a movement of cycle c counts
 * `move[c]`. Trapezoid: the mean of start and end. Simpson's 1/3 rule over pairs of
 * cycles: weights 1/3, 4/3, 1/3 on the three boundaries, shared out so that each
 * cycle's own weights sum to 1 (Elbasha and Chhatwal 2016; from memory).
 */
import type { DiscountRate, Question } from '../model/document.ts';
import { discountFactor } from './discount.ts';

export interface CountingWeights {
  readonly start: Float64Array;
  readonly end: Float64Array;
  readonly move: Float64Array;
}

type Counting = Question['counting'];

/** Shares of a cycle's start and end, before discounting. */
function shares(counting: Counting, cycle: number): readonly [number, number] {
  if (counting === 'start') return [1, 0];
  if (counting === 'end') return [0, 1];
  if (counting === 'trapezoid') return [0.5, 0.5];
  return cycle % 2 === 0 ? [1 / 3, 2 / 3] : [2 / 3, 1 / 3];
}

/** The times within cycle c, in cycles, whose factors the start, the end and a move take. */
function times(question: Question, cycle: number): { start: number; end: number; move: number[] } {
  const { at } = question.discounting;
  const once = { cycleStart: cycle, cycleMiddle: cycle + 0.5, cycleEnd: cycle + 1 };
  if (at !== 'counted') return { start: once[at], end: once[at], move: [once[at]] };
  const move = {
    start: [cycle],
    end: [cycle + 1],
    trapezoid: [cycle, cycle + 1],
    simpson: [cycle + 0.5],
  }[question.counting];
  return { start: cycle, end: cycle + 1, move };
}

/** A weight in its two parts: how much is counted, and what it is worth today. */
export interface Weight {
  /** Part of the cycle's payoff that is counted at this moment, 0 to 1. */
  readonly share: number;
  readonly discount: number;
}

/** One cycle's weights under one discount rate; a moment that does not count has discount 1. */
export function cycleWeights(
  question: Question,
  rate: DiscountRate,
  cycle: number,
): Record<'start' | 'end' | 'move', Weight> {
  const { cycleLength, discounting, counting } = question;
  const factor = (time: number) => discountFactor(rate, time * cycleLength, discounting.wholeYears);
  const weight = (share: number, time: number): Weight => ({
    share,
    discount: share === 0 ? 1 : factor(time),
  });
  const [first, last] = shares(counting, cycle);
  const at = times(question, cycle);
  const move = at.move.reduce((sum, time) => sum + factor(time), 0) / at.move.length;
  return {
    start: weight(first, at.start),
    end: weight(last, at.end),
    move: { share: 1, discount: move },
  };
}

/** Weights of all cycles under one discount rate. */
export function countingWeights(
  question: Question,
  rate: DiscountRate,
  cycles: number,
): CountingWeights {
  const start = new Float64Array(cycles);
  const end = new Float64Array(cycles);
  const move = new Float64Array(cycles);
  for (let cycle = 0; cycle < cycles; cycle++) {
    const weights = cycleWeights(question, rate, cycle);
    start[cycle] = weights.start.share * weights.start.discount;
    end[cycle] = weights.end.share * weights.end.discount;
    move[cycle] = weights.move.discount;
  }
  return { start, end, move };
}

/** The weight of each boundary 0..cycles for a payoff that is the same in every cycle. */
export function boundaryWeights(weights: Pick<CountingWeights, 'start' | 'end'>): Float64Array {
  const cycles = weights.start.length;
  const total = new Float64Array(cycles + 1);
  for (let cycle = 0; cycle < cycles; cycle++) {
    total[cycle] = total[cycle]! + weights.start[cycle]!;
    total[cycle + 1] = total[cycle + 1]! + weights.end[cycle]!;
  }
  return total;
}
