/** What one payoff adds up to for one profile, by the state that earned it. */
import type { Payoff } from '../../shared/model/document.ts';
import { discountFactor, type FactorAt, movementFactor, stateWeights } from './counting.ts';
import { evaluate, type Setting } from './evaluate.ts';
import { cycles, type Occupancy } from './occupancy.ts';

/** Totals by state id; `null` for what belongs to no state. */
export type ByState = Map<string | null, number>;

export function payoffTotals(payoff: Payoff, setting: Setting, cohort: Occupancy): ByState {
  const { discounting } = setting.document.question;
  const rate = payoff.measure === 'cost' ? discounting.costs : discounting.outcomes;
  const factor: FactorAt = (years) => discountFactor(rate, years, discounting.wholeYears);
  if (payoff.type === 'state') return stateTotals(payoff, setting, cohort, factor);
  if (payoff.type === 'movement')
    return new Map([[null, onMoving(payoff, setting, cohort, factor)]]);
  if (payoff.type === 'once') return new Map([[null, once(payoff, setting, cohort, factor)]]);
  return new Map([[null, evaluate(payoff.formula, setting, { cycle: 0, tunnel: 0 })]]);
}

function stateTotals(
  payoff: Extract<Payoff, { type: 'state' }>,
  setting: Setting,
  cohort: Occupancy,
  factor: FactorAt,
): ByState {
  const { question } = setting.document;
  const length = payoff.per === 'year' ? question.cycleLength : 1;
  const totals: ByState = new Map();
  for (let cycle = 0; cycle < cycles(setting); cycle++) {
    const weights = stateWeights(question, factor, cycle);
    cohort.places.forEach(({ state, tunnel }, i) => {
      for (const amount of payoff.amounts.filter((each) => each.state === state)) {
        const counted =
          weights.first * share(cohort, cycle, i) + weights.second * share(cohort, cycle + 1, i);
        const paid = evaluate(amount.formula, setting, { cycle, tunnel }) * length * counted;
        totals.set(state, (totals.get(state) ?? 0) + paid);
      }
    });
  }
  return totals;
}

const share = (cohort: Occupancy, boundary: number, place: number): number =>
  cohort.shares[boundary]?.[place] as number;

function onMoving(
  payoff: Extract<Payoff, { type: 'movement' }>,
  setting: Setting,
  cohort: Occupancy,
  factor: FactorAt,
): number {
  let total = 0;
  cohort.flows.forEach((flow, cycle) => {
    const worth = movementFactor(setting.document.question, factor, cycle);
    cohort.places.forEach((from, i) => {
      cohort.places.forEach((to, j) => {
        if (from.state === to.state) return;
        if (payoff.from !== undefined && payoff.from !== from.state) return;
        if (payoff.to !== undefined && payoff.to !== to.state) return;
        const paid = evaluate(payoff.formula, setting, { cycle, tunnel: from.tunnel });
        total += (flow[i]?.[j] as number) * paid * worth;
      });
    });
  });
  return total;
}

function once(
  payoff: Extract<Payoff, { type: 'once' }>,
  setting: Setting,
  cohort: Occupancy,
  factor: FactorAt,
): number {
  const { cycle } = payoff;
  if (cycle > cycles(setting)) return 0;
  const { states, question } = setting.document;
  const living = states.filter((state) => !state.dead).map((state) => state.id);
  const eligible = payoff.states ?? living;
  let present = 0;
  cohort.places.forEach(({ state }, i) => {
    if (eligible.includes(state)) present += share(cohort, cycle, i);
  });
  const paid = evaluate(payoff.formula, setting, { cycle, tunnel: 0 });
  return paid * present * factor(cycle * question.cycleLength);
}

/** Years in states that are not dead, undiscounted, counted as payoffs are. */
export function lifeYears(setting: Setting, cohort: Occupancy): number {
  const { question, states } = setting.document;
  let total = 0;
  for (let cycle = 0; cycle < cycles(setting); cycle++) {
    const weights = stateWeights(question, () => 1, cycle);
    cohort.places.forEach(({ state }, i) => {
      if (states.find((each) => each.id === state)?.dead) return;
      const counted =
        weights.first * share(cohort, cycle, i) + weights.second * share(cohort, cycle + 1, i);
      total += counted * question.cycleLength;
    });
  }
  return total;
}
