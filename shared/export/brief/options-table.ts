/** The table of options, in order of cost. */
import type { IncrementalRow, NoIcer } from '../../analysis/incremental.ts';
import type { BriefCase } from './case.ts';
import { type Frequency, naturalFrequency } from './frequency.ts';
import type { BriefPsa } from './psa.ts';
import { labels } from './sentence.ts';

export interface BriefOption {
  readonly id: string;
  readonly label: string;
  /** Money per person. */
  readonly cost: number;
  /** Primary outcome per person, in its own direction. */
  readonly outcome: number;
  /** Money per unit of health gained against `against`; null where `noIcer` says why. */
  readonly icer: number | null;
  readonly noIcer: NoIcer | null;
  /** Label of the strategy that the ICER is against. */
  readonly against: string | null;
  /** Labels of what rules it out, or of its twin. */
  readonly because: readonly string[];
  /** How often it is best among the draws; null without draws. */
  readonly best: Frequency | null;
  readonly isBest: boolean;
  readonly isComparator: boolean;
}

export function optionsTable(brief: BriefCase, psa: BriefPsa | null): BriefOption[] {
  const { document, base, rows } = brief;
  const label = labels(document.strategies);
  const outcomes = new Map(base.strategies.map(({ id, outcome }) => [id, outcome]));
  const chances = new Map(psa?.strategies.map(({ id, probabilityBest }) => [id, probabilityBest]));
  return rows.map((row) => {
    const chance = chances.get(row.id);
    return {
      id: row.id,
      label: label(row.id),
      cost: row.cost,
      outcome: outcomes.get(row.id) as number,
      icer: row.icer,
      noIcer: row.noIcer,
      against: row.against === null ? null : label(row.against),
      because: reasons(row).map(label),
      best: chance === undefined ? null : naturalFrequency(chance),
      isBest: row.id === brief.best,
      isComparator: row.id === document.question.comparator,
    };
  });
}

function reasons({ dominatedBy, extendedlyDominatedBy, tiedWith }: IncrementalRow): string[] {
  if (tiedWith !== null) return [tiedWith];
  if (dominatedBy !== null) return [dominatedBy];
  return [...(extendedlyDominatedBy ?? [])];
}
