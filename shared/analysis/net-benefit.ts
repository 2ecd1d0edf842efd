/**
 * Net benefit at a threshold (willingness to pay, money per unit of health):
 * net monetary benefit NMB = threshold x health - cost, and net health benefit
 * NHB = health - cost / threshold.
 * Source: Stinnett and Mullahy 1998, Medical Decision Making 18:S68-S80 (from memory).
 */
import { incremental } from './incremental.ts';
import { type Option, requireFinite } from './option.ts';
import { TIE } from './tie.ts';

export interface NetBenefitRow extends Option {
  /** Money per person. */
  readonly nmb: number;
  /** Units of health per person; null at a threshold of 0, where it is not defined. */
  readonly nhb: number | null;
}

export interface NetBenefits {
  readonly threshold: number;
  /** In the order given. */
  readonly rows: readonly NetBenefitRow[];
  /** The first given of `tied` that is on the frontier; null where nothing was given. */
  readonly best: string | null;
  /** All whose NMB is highest up to rounding, in the order given: more than one is a tie. */
  readonly tied: readonly string[];
}

export function netMonetaryBenefit(option: Omit<Option, 'id'>, threshold: number): number {
  return threshold * option.health - option.cost;
}

/**
 * How far apart two NMBs may lie and still be tied: the larger size of their parts
 * decides, as the parts may cancel and a threshold may itself come from a division.
 */
export function roundingOf(nmb: number, cost: number): number {
  return TIE * (Math.abs(nmb + cost) + Math.abs(cost));
}

/**
 * @param threshold 0 or more, finite.
 * @throws DocumentError `analysis.notFinite`
 */
export function netBenefit(options: readonly Option[], threshold: number): NetBenefits {
  requireFinite(options);
  const rows = options.map(({ id, cost, health }) => ({
    id,
    cost,
    health,
    nmb: netMonetaryBenefit({ cost, health }, threshold),
    nhb: threshold > 0 ? health - cost / threshold : null,
  }));
  const tied = highest(rows).map((row) => row.id);
  return { threshold, rows, best: choose(options, tied), tied };
}

function highest(rows: readonly NetBenefitRow[]): NetBenefitRow[] {
  const top = rows.reduce<NetBenefitRow | undefined>(
    (a, b) => (a === undefined || b.nmb > a.nmb ? b : a),
    undefined,
  );
  if (top === undefined) return [];
  const slack = roundingOf(top.nmb, top.cost);
  return rows.filter((row) => top.nmb - row.nmb <= Math.max(slack, roundingOf(row.nmb, row.cost)));
}

/**
 * Of strategies that tie, one of equal cost can be dominated (at a threshold of 0), or
 * lie on the line between two others: the frontier has the word.
 */
function choose(options: readonly Option[], tied: readonly string[]): string | null {
  const first = tied[0] ?? null;
  if (tied.length < 2) return first;
  const status = new Map(incremental(options).map((row) => [row.id, row.status]));
  const onFrontier = (id: string) => ['reference', 'frontier'].includes(status.get(id) ?? '');
  return tied.find(onFrontier) ?? first;
}
