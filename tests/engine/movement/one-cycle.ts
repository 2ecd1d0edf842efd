/** A model of one cycle, to read the chances of a movement basis off its trace. */
import { prepare } from '../../../shared/engine/engine.ts';
import type { ModelDocument, Row, State } from '../../../shared/model/document.ts';
import type { Issue } from '../../../shared/model/issue.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';

export interface OneCycle {
  readonly rows: readonly Row[];
  /** Ids of all states; those without a row are absorbing. */
  readonly states: readonly string[];
  readonly cycleLength?: number;
  /** Shares at the start by state; the first state takes the rest. */
  readonly start?: Record<string, number>;
}

export function oneCycleDocument(model: OneCycle): ModelDocument {
  const { rows, cycleLength = 1, start = {} } = model;
  const tiny = tinyDocument();
  const states: State[] = model.states.map((id) => ({
    id,
    label: id,
    type: rows.some((row) => row.from === id) ? 'ordinary' : 'absorbing',
    dead: false,
  }));
  const shares = Object.entries(start).map(([state, share]) => ({
    id: `start_${state}`,
    state,
    formula: String(share),
  }));
  return {
    ...tiny,
    question: { ...tiny.question, horizon: cycleLength, cycleLength, comparator: 'usual' },
    strategies: [{ id: 'usual', label: 'Usual care' }],
    variables: [],
    states,
    start: { remainder: model.states[0]!, shares },
    movements: { type: 'rows', rows: [...rows] },
    payoffs: [],
  };
}

/** Share of the cohort in each state after the cycle, and what running showed. */
export function afterOneCycle(model: OneCycle): { shares: number[]; problems: readonly Issue[] } {
  const run = prepare(oneCycleDocument(model)).base({ trace: true });
  return { shares: [...run.strategies[0]!.trace![1]!], problems: run.problems };
}
