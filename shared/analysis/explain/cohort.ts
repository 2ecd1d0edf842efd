/**
 * Single cohorts followed by plain arithmetic, so that any number of the base case can
 * be taken apart: occupancy of every substate at every boundary, and the value of any
 * node on the way.
 */
import { checkModel } from '../../engine/check.ts';
import { type CohortPlan, type CompiledModel, compile } from '../../engine/compile.ts';
import { NodeValues } from '../../engine/evaluate.ts';
import type { NodeId } from '../../engine/graph.ts';
import type { ModelDocument } from '../../model/document.ts';
import { DocumentError } from '../../model/issue.ts';

export class Cohort {
  readonly plan: CohortPlan;
  /** By boundary 0..N, by substate: share of the cohort. */
  readonly occupancy: readonly (readonly number[])[];
  private readonly values: NodeValues;

  /** @param profile, strategy indices in the document */
  constructor(
    readonly model: CompiledModel,
    strategy: number,
    profile: number,
    /** Share of the population that the cohort stands for, 0 to 1. */
    readonly share: number,
  ) {
    this.plan = model.plans[strategy] as CohortPlan;
    const parameters = model.document.parameters.map(({ value }) => value);
    this.values = new NodeValues(model, profile, parameters);
    this.occupancy = this.follow();
  }

  /** Value of a node during a cycle. */
  value(node: NodeId, cycle: number): number {
    return this.values.at(node, cycle);
  }

  private follow(): number[][] {
    const { initial, curves } = this.plan;
    const occupancy = [initial.map((node) => this.value(node, 0))];
    for (let cycle = 0; cycle < this.model.cycles; cycle++) {
      const next = curves?.map((node) => this.value(node, cycle));
      occupancy.push(next ?? this.step(occupancy[cycle] as number[], cycle));
    }
    return occupancy;
  }

  private step(now: readonly number[], cycle: number): number[] {
    const next = now.map(() => 0);
    for (const { from, to, chance } of this.plan.moves ?? []) {
      next[to] = (next[to] as number) + (now[from] as number) * this.value(chance, cycle);
    }
    return next;
  }
}

interface Kept {
  readonly model: CompiledModel;
  readonly cohorts: Map<string, Cohort>;
}

/** A document is plain data that nobody changes: what was compiled of it holds. */
const kept = new WeakMap<ModelDocument, Kept>();

function keptOf(document: ModelDocument): Kept {
  const known = kept.get(document);
  if (known) return known;
  const errors = checkModel(document).filter(({ severity }) => severity === 'error');
  if (errors.length > 0) throw new DocumentError(errors);
  const made = { model: compile(document), cohorts: new Map<string, Cohort>() };
  kept.set(document, made);
  return made;
}

/**
 * The cohorts of one strategy that a number is made of: that of one profile, with share
 * 1, or those of all profiles, each with its share.
 * @param profile id, or null for the whole population
 * @throws DocumentError where the document has errors; RangeError for unknown ids
 */
export function cohortsOf(
  document: ModelDocument,
  strategy: string,
  profile: string | null,
): Cohort[] {
  const { strategies, profiles } = document;
  const index = strategies.findIndex(({ id }) => id === strategy);
  if (index < 0) throw new RangeError(`strategy ${strategy}`);
  if (profile === null) {
    return profiles.map(({ share }, at) => cohortOf(document, index, at, share));
  }
  const at = profiles.findIndex(({ id }) => id === profile);
  if (at < 0) throw new RangeError(`profile ${profile}`);
  return [cohortOf(document, index, at, 1)];
}

function cohortOf(document: ModelDocument, strategy: number, profile: number, share: number) {
  const { model, cohorts } = keptOf(document);
  const key = `${strategy} ${profile} ${share}`;
  const cohort = cohorts.get(key) ?? new Cohort(model, strategy, profile, share);
  cohorts.set(key, cohort);
  return cohort;
}
