/** Names that a formula may use without a document defining them. */

/** Quantities that move with the model's clock; see docs in shared/formula. */
export const CLOCKS = ['cycle', 'time', 'age', 'time_in_state', 'cycle_length'] as const;
export type Clock = (typeof CLOCKS)[number];

/** The covariate that the clock `age` starts from, in years. */
export const START_AGE = 'start_age';

/** Words of the formula language itself. */
export const WORDS = ['and', 'or', 'not', 'if', 'true', 'false'] as const;

/** Keys that no document may hold anywhere: they reach into JavaScript objects. */
export const HOSTILE_KEYS: ReadonlySet<string> = new Set(['__proto__', 'constructor', 'prototype']);
