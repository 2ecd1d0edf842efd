import type { en } from './en.ts';

/** The same keys as English, each with words of its own. */
export type Words = SameKeys<typeof en>;

type SameKeys<T> = { readonly [K in keyof T]: T[K] extends string ? string : SameKeys<T[K]> };
