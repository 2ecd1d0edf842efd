/**
 * Sentences of the brief as data: a code that the interface words in the reader's
 * language, and typed values, so that each is written as its kind is.
 */
import type { Frequency } from './frequency.ts';

export type BriefValue =
  /** The document's own words: labels of strategies, profiles, payers. */
  | { readonly as: 'text'; readonly value: string }
  | { readonly as: 'list'; readonly value: readonly string[] }
  /** A word of ours to be looked up, such as a way of counting. */
  | { readonly as: 'code'; readonly value: string }
  /** Per person; may be below 0. */
  | { readonly as: 'money'; readonly value: number }
  /** For many: rounded when written. */
  | { readonly as: 'largeMoney'; readonly value: number }
  /** Money per unit of health. */
  | { readonly as: 'threshold'; readonly value: number }
  /** Units of health gained or lost, 0 or more. */
  | { readonly as: 'gain'; readonly value: number }
  | { readonly as: 'loss'; readonly value: number }
  | { readonly as: 'count'; readonly value: number }
  | { readonly as: 'years'; readonly value: number }
  /** Calendar year: written without separators. */
  | { readonly as: 'calendarYear'; readonly value: number }
  /** A share or a rate, 0.03 for 3%. */
  | { readonly as: 'percent'; readonly value: number }
  | { readonly as: 'frequency'; readonly value: Frequency };

export interface Sentence {
  /** Stable within a brief: what an author has put in a sentence's place is kept by it. */
  readonly code: string;
  readonly params: Readonly<Record<string, BriefValue>>;
}

/** Values by kind, short to write. */
export const value = {
  text: (text: string): BriefValue => ({ as: 'text', value: text }),
  list: (texts: readonly string[]): BriefValue => ({ as: 'list', value: texts }),
  code: (code: string): BriefValue => ({ as: 'code', value: code }),
  money: (money: number): BriefValue => ({ as: 'money', value: money }),
  largeMoney: (money: number): BriefValue => ({ as: 'largeMoney', value: money }),
  threshold: (threshold: number): BriefValue => ({ as: 'threshold', value: threshold }),
  health: (health: number): BriefValue => ({
    as: health < 0 ? 'loss' : 'gain',
    value: Math.abs(health),
  }),
  count: (count: number): BriefValue => ({ as: 'count', value: count }),
  years: (years: number): BriefValue => ({ as: 'years', value: years }),
  calendarYear: (year: number): BriefValue => ({ as: 'calendarYear', value: year }),
  percent: (share: number): BriefValue => ({ as: 'percent', value: share }),
  frequency: (frequency: Frequency): BriefValue => ({ as: 'frequency', value: frequency }),
};

/** Labels by id, as the brief names things. */
export function labels(
  things: readonly { readonly id: string; readonly label: string }[],
): (id: string) => string {
  const byId = new Map(things.map(({ id, label }) => [id, label]));
  return (id) => byId.get(id) ?? id;
}
