/**
 * The one place where outcomes of which fewer is better (DALYs) are turned. Everything
 * past it speaks of health: more is better, health = outcome or health = -outcome.
 */
import type { Question } from '../model/document.ts';

export type Direction = Question['outcome']['direction'];

/** Health of an outcome. Turning twice gives the outcome back; 0 stays 0, never -0. */
export function toHealth(outcome: number, direction: Direction): number {
  return direction === 'fewerIsBetter' ? 0 - outcome : outcome;
}

/** Health of a column of draws: a new column where turned, else the column itself. */
export function toHealthColumn(outcome: Float64Array, direction: Direction): Float64Array {
  return direction === 'fewerIsBetter' ? outcome.map((value) => 0 - value) : outcome;
}
