/** How far a lever goes, and where it stands while nobody moves it. */
import { INTERVAL } from '../../../shared/analysis/psa/means.ts';
import { marginalOf } from '../../../shared/engine/distributions/marginal.ts';
import type { ModelDocument, Question } from '../../../shared/model/document.ts';
import type { Override } from '../../store/levers.ts';

export interface LeverRange {
  readonly low: number;
  readonly high: number;
  /** What one press of an arrow key moves. */
  readonly step: number;
  /** Of the model as it is. */
  readonly base: number;
}

const STEPS = 100;
const FIGURES = 4;
/** Discount rates a year that are asked for somewhere lie within. */
const HIGHEST_RATE = 0.1;

/** Null for what does not slide: formulas, ways of counting, rates by year, what is fixed. */
export function rangeOf(document: ModelDocument, override: Override): LeverRange | null {
  if (override.type === 'parameter') return parameterRange(document, override.parameter);
  if (override.type === 'variable') return null;
  const { question } = document;
  switch (override.setting) {
    case 'horizon':
      return horizonRange(question);
    case 'discountCosts':
      return rateRange(question.discounting.costs);
    case 'discountOutcomes':
      return rateRange(question.discounting.outcomes);
    case 'counting':
      return null;
  }
}

/** Within the 95% interval of its distribution, the base value kept within reach. */
function parameterRange(document: ModelDocument, id: string): LeverRange | null {
  const parameter = document.parameters.find((each) => each.id === id);
  if (!parameter || parameter.distribution.type === 'fixed') return null;
  const marginal = marginalOf(parameter, document.groups);
  const ends = INTERVAL.map((p) => rounded(marginal.quantile(p)));
  const low = Math.min(...ends, parameter.value);
  const high = Math.max(...ends, parameter.value);
  if (!Number.isFinite(high - low) || high <= low) return null;
  return { low, high, step: rounded((high - low) / STEPS), base: parameter.value };
}

function horizonRange({ horizon, cycleLength }: Question): LeverRange {
  const step = Math.max(cycleLength, 1);
  return { low: step, high: Math.max(2 * step, 1.5 * horizon), step, base: horizon };
}

function rateRange(rate: Question['discounting']['costs']): LeverRange | null {
  if (typeof rate !== 'number') return null;
  return { low: 0, high: Math.max(HIGHEST_RATE, rate), step: 0.005, base: rate };
}

export function rounded(value: number): number {
  return Number(value.toPrecision(FIGURES));
}
