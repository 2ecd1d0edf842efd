/** The answer before the last change, whether an edit or a movement of the poise made it. */
import { useRef } from 'react';
import type { Answered } from '../../store/live-answer.ts';
import type { PoisePlace } from '../../store/poise.ts';

/** What the numbers were taken from, before. */
export interface Earlier {
  readonly answered: Answered;
  readonly threshold: number;
}

/**
 * Null where nothing has changed yet.
 * @param was as the live answer tells it: the keystrokes of one group are one change
 */
export function useEarlier(now: Answered, was: Answered | null, place: PoisePlace): Earlier | null {
  // Where the poise stood when the document in view came.
  const came = useRef({ document: now.document, place });
  if (came.current.document !== now.document) came.current = { document: now.document, place };
  if (was && came.current.place === place) return { answered: was, threshold: place.now };
  return place.was === null ? null : { answered: now, threshold: place.was };
}
