/** Bounds on what is read, so that a hostile or mistaken file is refused quickly. */

/** Size of a document's text, in UTF-8 bytes. */
export const MAX_BYTES = 10_000_000;
/** Objects and lists inside one another. */
export const MAX_DEPTH = 64;
/** Values of any type in one document: above what MAX_BYTES of JSON can hold. */
export const MAX_VALUES = 6_000_000;
/** Keys of one object: far above any that the format knows. */
export const MAX_KEYS = 10_000;
/** Issues that are listed one by one. */
export const MAX_ISSUES = 100;
/** Cycles that a model may run. */
export const MAX_CYCLES = 10_000;
/** States after those with time in state are expanded into tunnels. */
export const MAX_EXPANDED_STATES = 500;
/** Strategies x profiles x cycles x expanded states of one run. */
export const MAX_WORK = 50_000_000;
