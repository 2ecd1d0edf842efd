/**
 * Time in state: a timed state becomes a tunnel of substates, one a cycle spent in
 * it, of which the last holds. Everything else has one substate.
 */
import type { State } from '../model/document.ts';

export interface Substate {
  /** Index of the document's state. */
  readonly state: number;
  /** Cycles spent in the state so far; 0 on arrival. */
  readonly tunnel: number;
}

export interface Substates {
  readonly all: readonly Substate[];
  /** Position in `all` of each state's first substate. */
  readonly first: readonly number[];
  /** Number of substates of each state. */
  readonly length: readonly number[];
}

export function expandStates(states: readonly State[]): Substates {
  const all: Substate[] = [];
  const first: number[] = [];
  const length: number[] = [];
  states.forEach((state, index) => {
    const tunnels = state.type === 'timed' ? (state.cycles ?? 1) : 1;
    first.push(all.length);
    length.push(tunnels);
    for (let tunnel = 0; tunnel < tunnels; tunnel++) all.push({ state: index, tunnel });
  });
  return { all, first, length };
}

/** Where a move from a substate to a state arrives: staying goes one tunnel on. */
export function arrival(substates: Substates, from: Substate, to: number): number {
  const first = substates.first[to] as number;
  if (from.state !== to) return first;
  return first + Math.min(from.tunnel + 1, (substates.length[to] as number) - 1);
}
