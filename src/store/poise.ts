/** Where the poise stands, and where it stood before the movement that brought it there. */
import { useReducer } from 'react';
import type { Move } from '../components/move.ts';

export interface PoisePlace {
  readonly now: number;
  /** Null until it is first moved. */
  readonly was: number | null;
}

/** One drag, or one key held down, is one movement, however many places it passes. */
export function movePoise(place: PoisePlace, move: Move): PoisePlace {
  if (move.starts) return { now: move.to, was: place.now };
  return { now: move.to, was: place.was ?? place.now };
}

export function usePoise(first: number): [PoisePlace, (move: Move) => void] {
  return useReducer(movePoise, { now: first, was: null });
}
