/**
 * Costs and outcomes as terms: an amount for being in a substate, at certain moments.
 * A movement's payoff becomes an amount for being in the origin at the start of the
 * cycle (the chance of the move times its value), so the simulation knows of
 * occupancy only.
 */
import type { Payoff, StrategyFormula } from '../model/document.ts';
import type { NodeId } from './graph.ts';
import type { Lowering, Place } from './lower.ts';
import type { Chance } from './movement/row.ts';
import type { Substates } from './substates.ts';

/** When a term counts: each cycle's occupancy, each cycle's moves, one boundary, or at once. */
export type Moment = 'occupancy' | 'moves' | 'start' | { readonly boundary: number };

export interface PayoffTerm {
  /** Index of the payoff in the document. */
  readonly payoff: number;
  readonly measure: 'cost' | 'outcome';
  readonly moment: Moment;
  /** Substate whose occupancy it multiplies; null for the whole cohort at the start. */
  readonly substate: number | null;
  readonly value: NodeId;
}

export interface PayoffPlace {
  readonly lowering: Lowering;
  readonly substates: Substates;
  readonly stateIndex: (id: string) => number;
  readonly isDead: (state: number) => boolean;
  readonly strategy: string;
  /** Place of a substate at the running cycle. */
  readonly place: (substate: number) => Place;
  /** Chances of moving out of each substate; null under survival curves. */
  readonly chances: readonly (readonly Chance[])[] | null;
}

/** The terms of one payoff for one strategy. */
export function payoffTerms(payoff: Payoff, index: number, at: PayoffPlace): PayoffTerm[] {
  if (payoff.strategies && !payoff.strategies.includes(at.strategy)) return [];
  const terms = termsByType(payoff, at);
  return terms.map((term) => ({ payoff: index, measure: payoff.measure, ...term }));
}

type BareTerm = Omit<PayoffTerm, 'payoff' | 'measure'>;

function termsByType(payoff: Payoff, at: PayoffPlace): BareTerm[] {
  switch (payoff.type) {
    case 'state':
      return stateTerms(payoff, at);
    case 'movement':
      return movementTerms(payoff, at);
    case 'once':
      return onceTerms(payoff, at);
    case 'start':
      return [{ moment: 'start', substate: null, value: atMoment(payoff.formula, 0, at) }];
  }
}

function stateTerms(payoff: Extract<Payoff, { type: 'state' }>, at: PayoffPlace): BareTerm[] {
  const { lowering } = at;
  return payoff.amounts.flatMap((amount) =>
    substatesOf(at, at.stateIndex(amount.state)).map((substate) => {
      const place = at.place(substate);
      const value = lowering.formula(amount.formula, place);
      const years = lowering.formula('cycle_length', place);
      const flow = payoff.per === 'year' ? lowering.graph.binary('multiply', value, years) : value;
      return { moment: 'occupancy' as const, substate, value: flow };
    }),
  );
}

function movementTerms(payoff: Extract<Payoff, { type: 'movement' }>, at: PayoffPlace): BareTerm[] {
  const { graph } = at.lowering;
  const from = payoff.from === undefined ? null : at.stateIndex(payoff.from);
  const to = payoff.to === undefined ? null : at.stateIndex(payoff.to);
  return at.substates.all.flatMap(({ state }, substate) => {
    if (from !== null && state !== from) return [];
    const moves = (at.chances?.[substate] ?? []).filter(
      (chance) => chance.to !== state && (to === null || chance.to === to),
    );
    if (moves.length === 0) return [];
    const amount = at.lowering.formula(payoff.formula, at.place(substate));
    const chance = graph.sum(moves.map((move) => move.chance));
    return [
      { moment: 'moves' as const, substate, value: graph.binary('multiply', chance, amount) },
    ];
  });
}

function onceTerms(payoff: Extract<Payoff, { type: 'once' }>, at: PayoffPlace): BareTerm[] {
  const states = payoff.states?.map(at.stateIndex);
  const value = atMoment(payoff.formula, payoff.cycle, at);
  return at.substates.all.flatMap(({ state }, substate) => {
    const paid = states ? states.includes(state) : !at.isDead(state);
    return paid ? [{ moment: { boundary: payoff.cycle }, substate, value }] : [];
  });
}

/** A formula with its clocks held at one cycle. */
function atMoment(formula: StrategyFormula, cycle: number, at: PayoffPlace): NodeId {
  const place = { strategy: at.strategy, cycle: at.lowering.graph.constant(cycle) };
  return at.lowering.formula(formula, place);
}

function substatesOf(at: PayoffPlace, state: number): number[] {
  const first = at.substates.first[state] as number;
  return Array.from({ length: at.substates.length[state] as number }, (_, k) => first + k);
}
