/** When within a cycle a payoff is counted, and what it is then worth. */
import type { DiscountRate, Question } from '../../shared/model/document.ts';

/** Factor by which a payoff at `years` counts today. */
export function discountFactor(rate: DiscountRate, years: number, wholeYears: boolean): number {
  const time = wholeYears ? Math.floor(years + 1e-12) : years;
  if (typeof rate === 'number') return (1 + rate) ** -time;
  let factor = 1;
  for (let year = 0; year < time; year++) {
    const part = Math.min(1, time - year);
    const last = rate.byYear.length - 1;
    factor *= (1 + (rate.byYear[Math.min(year, last)] as number)) ** -part;
  }
  return factor;
}

export type FactorAt = (years: number) => number;

/** Weights of a cycle's first and second boundary, discounted. */
export function stateWeights(question: Question, factor: FactorAt, cycle: number) {
  const [first, second] = boundaryWeights(question.counting, cycle);
  const fixed = fixedFactor(question, factor, cycle);
  const dt = question.cycleLength;
  return {
    first: first * (fixed ?? factor(cycle * dt)),
    second: second * (fixed ?? factor((cycle + 1) * dt)),
  };
}

function boundaryWeights(counting: Question['counting'], cycle: number): [number, number] {
  if (counting === 'start') return [1, 0];
  if (counting === 'end') return [0, 1];
  if (counting === 'trapezoid') return [1 / 2, 1 / 2];
  return cycle % 2 === 0 ? [1 / 3, 2 / 3] : [2 / 3, 1 / 3];
}

/** The whole cycle's factor where the question sets a time for it. */
function fixedFactor(question: Question, factor: FactorAt, cycle: number): number | undefined {
  const dt = question.cycleLength;
  const { at } = question.discounting;
  if (at === 'cycleStart') return factor(cycle * dt);
  if (at === 'cycleMiddle') return factor(cycle * dt + dt / 2);
  if (at === 'cycleEnd') return factor((cycle + 1) * dt);
  return undefined;
}

/** Factor of what is paid on moving during a cycle. */
export function movementFactor(question: Question, factor: FactorAt, cycle: number): number {
  const fixed = fixedFactor(question, factor, cycle);
  if (fixed !== undefined) return fixed;
  const dt = question.cycleLength;
  if (question.counting === 'start') return factor(cycle * dt);
  if (question.counting === 'end') return factor((cycle + 1) * dt);
  if (question.counting === 'simpson') return factor(cycle * dt + dt / 2);
  return (factor(cycle * dt) + factor((cycle + 1) * dt)) / 2;
}
