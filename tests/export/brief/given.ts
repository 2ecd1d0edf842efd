/** Base cases and chances of given numbers, to read a brief of. */

import type { BaseRun, StrategyRun } from '../../../shared/engine/results.ts';
import type { BriefPsa } from '../../../shared/export/brief/psa.ts';
import type { Sentence } from '../../../shared/export/brief/sentence.ts';
import type { ModelDocument } from '../../../shared/model/document.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';

export type Given = Readonly<Record<string, readonly [cost: number, outcome: number]>>;

/** Strategies labelled by their ids in capitals; the first is the comparator. */
export function given(results: Given): { document: ModelDocument; base: BaseRun } {
  const tiny = tinyDocument();
  const ids = Object.keys(results);
  const profile = tiny.profiles[0]!.id;
  const strategies = ids.map((id): StrategyRun => {
    const [cost, outcome] = results[id]!;
    const totals = { cost, outcome, lifeYears: 0 };
    return { id, ...totals, byProfile: [{ id: profile, ...totals }], byPayoff: [] };
  });
  return {
    document: tinyDocument({
      strategies: ids.map((id) => ({ id, label: id.toUpperCase() })),
      question: { ...tiny.question, comparator: ids[0]! },
    }),
    base: { strategies, cycleLength: 1, cycles: 10, problems: [] },
  };
}

export function chances(
  probabilities: Readonly<Record<string, number>>,
  losses: Readonly<Record<string, number>> = {},
  evpi: BriefPsa['evpi'] = { perPerson: 2, population: null },
): BriefPsa {
  const strategies = Object.entries(probabilities).map(([id, probabilityBest]) => ({
    ...{ id, probabilityBest },
    expectedLoss: losses[id] ?? 1 - probabilityBest,
  }));
  return { samples: 1_000, strategies, evpi };
}

/** A sentence with its values bare. */
export function told({ code, params }: Sentence): readonly [string, Record<string, unknown>] {
  return [code, Object.fromEntries(Object.entries(params).map(([key, { value }]) => [key, value]))];
}
