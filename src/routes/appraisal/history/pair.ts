/** Two versions to be set side by side; the draft may be one of them. */

/** In the stead of a digest: the work as it stands. */
export const DRAFT = 'draft';

export interface Pair {
  readonly before: string;
  readonly after: string;
}
