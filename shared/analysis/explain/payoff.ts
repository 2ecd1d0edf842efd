/**
 * A payoff's total taken apart, cycle by cycle: who was where, what each counted, how
 * much of it, worth what today. The products sum to the total.
 */
import { cycleWeights, type Weight } from '../../engine/counting.ts';
import { discountFactor } from '../../engine/discount.ts';
import type { PayoffTerm } from '../../engine/payoffs.ts';
import type { ModelDocument, Payoff, StrategyFormula } from '../../model/document.ts';
import type { Path } from '../../model/issue.ts';
import { type Cohort, cohortsOf } from './cohort.ts';
import { Mean } from './mean.ts';
import { type FormulaSite, siteOf } from './site.ts';

export interface PayoffPart {
  /** State occupied or, for a movement, left; null for the whole cohort at the start. */
  readonly state: string | null;
  /** When it is counted: start or end of the cycle, on moving, once, or at time 0. */
  readonly moment: 'start' | 'end' | 'move' | 'once' | 'atStart';
  /** Share of the cohort there then; for a movement, the share that moves. */
  readonly occupancy: number;
  /** Amount a person for the cycle (or move); the mean where it differs; null for nobody. */
  readonly value: number | null;
  /** Part that is counted at this moment. */
  readonly share: number;
  readonly discount: number;
  /** Occupancy x value x share x discount. */
  readonly product: number;
}

export interface PayoffCycle {
  readonly cycle: number;
  readonly parts: readonly PayoffPart[];
  readonly total: number;
  /** Sum up to this cycle. */
  readonly running: number;
}

export interface PayoffExplanation {
  /** Formulas that it is made of, with their state where it has several. */
  readonly sites: readonly (FormulaSite & { readonly state: string | null })[];
  /** None where the payoff does not apply to the strategy or lies beyond the horizon. */
  readonly cycles: readonly PayoffCycle[];
  /** As the run's `byPayoff` adds up to, for the whole population. */
  readonly total: number;
}

/**
 * @param profile id, or null for the whole population
 * @param payoff id
 * @throws DocumentError where the document has errors; RangeError for unknown ids
 */
export function explainPayoff(
  document: ModelDocument,
  strategy: string,
  profile: string | null,
  payoff: string,
): PayoffExplanation {
  const index = document.payoffs.findIndex(({ id }) => id === payoff);
  const found = document.payoffs[index];
  if (!found) throw new RangeError(`payoff ${payoff}`);
  const cohorts = cohortsOf(document, strategy, profile);
  const { plan } = cohorts[0] as Cohort;
  const terms = plan.terms.filter((term) => term.payoff === index);
  const work = new PayoffWork(document, found, cohorts, terms);
  const cycles = work.cycles();
  const total = cycles.at(-1)?.running ?? 0;
  return { sites: sitesOf(found, index, strategy), cycles, total };
}

class PayoffWork {
  private readonly states: readonly number[];

  constructor(
    private readonly document: ModelDocument,
    private readonly payoff: Payoff,
    private readonly cohorts: readonly Cohort[],
    private readonly terms: readonly PayoffTerm[],
  ) {
    this.states = [...new Set(terms.flatMap((term) => this.stateOf(term) ?? []))];
  }

  cycles(): PayoffCycle[] {
    if (this.terms.length === 0) return [];
    const { cycles } = this.model;
    const { payoff } = this;
    if (payoff.type === 'start') return summed([[0, [this.startPart()]]]);
    if (payoff.type === 'once') {
      return payoff.cycle > cycles ? [] : summed([[payoff.cycle, this.onceParts(payoff.cycle)]]);
    }
    return summed(Array.from({ length: cycles }, (_, cycle) => [cycle, this.cycleParts(cycle)]));
  }

  private get model() {
    return (this.cohorts[0] as Cohort).model;
  }

  private get rate() {
    const { costs, outcomes } = this.document.question.discounting;
    return this.payoff.measure === 'cost' ? costs : outcomes;
  }

  private stateOf({ substate }: PayoffTerm): number | null {
    return substate === null ? null : (this.model.substates.all[substate]?.state ?? null);
  }

  private startPart(): PayoffPart {
    const mean = new Mean();
    for (const cohort of this.cohorts) {
      for (const { value } of this.terms) mean.add(cohort.share, cohort.value(value, 0));
    }
    return part(null, 'atStart', mean, { share: 1, discount: 1 });
  }

  private onceParts(boundary: number): PayoffPart[] {
    const { cycleLength, discounting } = this.document.question;
    const time = boundary * cycleLength;
    const discount = discountFactor(this.rate, time, discounting.wholeYears);
    // The formula's clocks are held at its own cycle: any cycle gives the same value.
    return this.occupancyParts('once', boundary, 0, { share: 1, discount });
  }

  private cycleParts(cycle: number): PayoffPart[] {
    const weights = cycleWeights(this.document.question, this.rate, cycle);
    if (this.payoff.type === 'movement') return this.moveParts(cycle, weights.move);
    return (['start', 'end'] as const).flatMap((moment) => {
      const boundary = moment === 'start' ? cycle : cycle + 1;
      const weight = weights[moment];
      return weight.share === 0 ? [] : this.occupancyParts(moment, boundary, cycle, weight);
    });
  }

  private occupancyParts(
    moment: PayoffPart['moment'],
    boundary: number,
    cycle: number,
    weight: Weight,
  ): PayoffPart[] {
    return this.states.map((state) => {
      const mean = new Mean();
      this.eachTerm(state, (cohort, term, substate) => {
        const there = cohort.share * (cohort.occupancy[boundary]?.[substate] as number);
        mean.add(there, cohort.value(term.value, cycle));
      });
      return part(this.idOf(state), moment, mean, weight);
    });
  }

  /** A term's value is the chance of moving times the amount; here the two are told apart. */
  private moveParts(cycle: number, weight: Weight): PayoffPart[] {
    return this.states.map((state) => {
      const mean = new Mean();
      this.eachTerm(state, (cohort, term, substate) => {
        const there = cohort.share * (cohort.occupancy[cycle]?.[substate] as number);
        const moving = there * this.chanceOfMoving(cohort, substate, cycle);
        mean.addSum(moving, there * cohort.value(term.value, cycle));
      });
      return part(this.idOf(state), 'move', mean, weight);
    });
  }

  private chanceOfMoving(cohort: Cohort, substate: number, cycle: number): number {
    const { all } = this.model.substates;
    const to = this.payoff.type === 'movement' ? this.payoff.to : undefined;
    return (cohort.plan.moves ?? []).reduce((sum, move) => {
      const arrival = all[move.to]!.state;
      const leaves = move.from === substate && arrival !== all[substate]!.state;
      const counted = leaves && (to === undefined || this.idOf(arrival) === to);
      return counted ? sum + cohort.value(move.chance, cycle) : sum;
    }, 0);
  }

  private eachTerm(
    state: number,
    visit: (cohort: Cohort, term: PayoffTerm, substate: number) => void,
  ): void {
    for (const cohort of this.cohorts) {
      for (const term of this.terms) {
        if (term.substate !== null && this.stateOf(term) === state) {
          visit(cohort, term, term.substate);
        }
      }
    }
  }

  private idOf(state: number): string {
    return this.document.states[state]!.id;
  }
}

function part(
  state: string | null,
  moment: PayoffPart['moment'],
  mean: Mean,
  { share, discount }: Weight,
): PayoffPart {
  const product = mean.sum * share * discount;
  return { state, moment, occupancy: mean.weight, value: mean.value, share, discount, product };
}

function summed(cycles: readonly (readonly [number, readonly PayoffPart[]])[]): PayoffCycle[] {
  let running = 0;
  return cycles.map(([cycle, parts]) => {
    const total = parts.reduce((sum, { product }) => sum + product, 0);
    running += total;
    return { cycle, parts, total, running };
  });
}

function sitesOf(payoff: Payoff, index: number, strategy: string): PayoffExplanation['sites'] {
  const site = (state: string | null, formula: StrategyFormula, path: Path) => {
    const found = siteOf(formula, ['payoffs', index, ...path, 'formula'], strategy);
    return found ? [{ state, ...found }] : [];
  };
  if (payoff.type !== 'state') return site(null, payoff.formula, []);
  return payoff.amounts.flatMap(({ state, formula }, at) => site(state, formula, ['amounts', at]));
}
