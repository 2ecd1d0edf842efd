/**
 * Full incremental analysis: order by cost, remove the dominated, then the extendedly
 * dominated, and take incremental cost-effectiveness ratios (ICERs) along the
 * efficiency frontier that is left.
 *
 * Dominated: another strategy costs no more and gives no less, one of them strictly.
 * Extendedly dominated: a mix of two frontier strategies of the same cost gives no less
 * health, so ICERs along the frontier strictly rise.
 * Source: Drummond et al. 2015, Methods for the Economic Evaluation of Health Care
 * Programmes; Briggs, Claxton and Sculpher 2006 (from memory).
 */
import { type Option, requireFinite } from './option.ts';
import { snap, TIE } from './tie.ts';

export type Status = 'reference' | 'frontier' | 'dominated' | 'extendedlyDominated';

/** Why there is no ICER; `tied`: same cost and health as `tiedWith`, which has it. */
export type NoIcer = 'reference' | 'dominated' | 'extendedlyDominated' | 'tied' | 'beyondNumbers';

export interface IncrementalRow extends Option {
  readonly status: Status;
  /** Money per unit of health gained, above 0; null where there is none (see `noIcer`). */
  readonly icer: number | null;
  readonly noIcer: NoIcer | null;
  /** The frontier neighbour, next cheaper, that the increments and the ICER are against. */
  readonly against: string | null;
  readonly incrementalCost: number | null;
  readonly incrementalHealth: number | null;
  /** A strategy that dominates this one: on the frontier where there is such a one. */
  readonly dominatedBy: string | null;
  /** The frontier neighbours, cheaper then dearer, whose mix is as good or better. */
  readonly extendedlyDominatedBy: readonly [string, string] | null;
  /** First strategy, in the order given, of the same cost and health. */
  readonly tiedWith: string | null;
}

/** A strategy with its cost and health made equal to those they are tied with. */
interface Point {
  readonly option: Option;
  readonly cost: number;
  readonly health: number;
}

/**
 * Rows in order of cost, then of falling health, then as given. A strategy tied with a
 * frontier strategy that was given earlier has status `frontier` and no ICER of its own.
 * @throws DocumentError `analysis.notFinite`
 */
export function incremental(options: readonly Option[]): IncrementalRow[] {
  requireFinite(options);
  const points = byCost(options);
  const distinct = points.filter((point, i) => !same(point, points[i - 1]));
  const undominated = removeDominated(distinct);
  const frontier = removeExtendedlyDominated(undominated);
  const rows = new Map(
    distinct.map((point) => [point, describe(point, frontier, undominated)] as const),
  );
  let first: Point | undefined;
  return points.map((point) => {
    if (same(point, first)) return tiedRow(point, rows.get(first as Point) as IncrementalRow);
    first = point;
    return rows.get(point) as IncrementalRow;
  });
}

/** The frontier itself, in order of cost: one row for strategies that are tied. */
export function frontierRows(rows: readonly IncrementalRow[]): IncrementalRow[] {
  return rows.filter(
    ({ status, tiedWith }) =>
      (status === 'reference' || status === 'frontier') && tiedWith === null,
  );
}

function byCost(options: readonly Option[]): Point[] {
  const costs = snap(options.map((option) => option.cost));
  const healths = snap(options.map((option) => option.health));
  return options
    .map((option, i) => ({ option, cost: costs[i] as number, health: healths[i] as number }))
    .sort((a, b) => a.cost - b.cost || b.health - a.health);
}

function same(a: Point, b: Point | undefined): boolean {
  return b !== undefined && a.cost === b.cost && a.health === b.health;
}

/** In order of cost, a strategy is dominated unless it gives more than all before it. */
function removeDominated(distinct: readonly Point[]): Point[] {
  let most = Number.NEGATIVE_INFINITY;
  return distinct.filter((point) => {
    if (point.health <= most) return false;
    most = point.health;
    return true;
  });
}

/** The lower convex hull, by a scan that takes back what a later strategy rules out. */
function removeExtendedlyDominated(undominated: readonly Point[]): Point[] {
  const hull: Point[] = [];
  for (const point of undominated) {
    while (hull.length >= 2 && !rises(hull.at(-2) as Point, hull.at(-1) as Point, point)) {
      hull.pop();
    }
    hull.push(point);
  }
  return hull;
}

/**
 * Whether the ICER of c against b is above that of b against a, by more than ties in
 * their costs and health could make. Cross-multiplied: steps of health can be tiny.
 */
function rises(a: Point, b: Point, c: Point): boolean {
  const before = (b.cost - a.cost) * (c.health - b.health);
  const after = (c.cost - b.cost) * (b.health - a.health);
  const money = Math.max(Math.abs(a.cost), Math.abs(c.cost)) * (c.health - a.health);
  const health = Math.max(Math.abs(a.health), Math.abs(c.health)) * (c.cost - a.cost);
  return after - before > TIE * (money + health);
}

function describe(point: Point, frontier: Point[], undominated: Point[]): IncrementalRow {
  const place = frontier.indexOf(point);
  if (place === 0) return { ...plain(point), status: 'reference', noIcer: 'reference' };
  if (place > 0) return frontierRow(point, frontier[place - 1] as Point);
  return undominated.includes(point)
    ? {
        ...plain(point),
        status: 'extendedlyDominated',
        noIcer: 'extendedlyDominated',
        extendedlyDominatedBy: neighbours(point, frontier),
      }
    : {
        ...plain(point),
        status: 'dominated',
        noIcer: 'dominated',
        dominatedBy: dominator(point, [...frontier, ...undominated]),
      };
}

function plain({ option }: Point): Omit<IncrementalRow, 'status'> {
  return {
    id: option.id,
    cost: option.cost,
    health: option.health,
    icer: null,
    noIcer: null,
    against: null,
    incrementalCost: null,
    incrementalHealth: null,
    dominatedBy: null,
    extendedlyDominatedBy: null,
    tiedWith: null,
  };
}

function frontierRow(point: Point, previous: Point): IncrementalRow {
  const incrementalCost = point.option.cost - previous.option.cost;
  const incrementalHealth = point.option.health - previous.option.health;
  const icer = incrementalCost / incrementalHealth;
  return {
    ...plain(point),
    status: 'frontier',
    icer: Number.isFinite(icer) ? icer : null,
    noIcer: Number.isFinite(icer) ? null : 'beyondNumbers',
    against: previous.option.id,
    incrementalCost,
    incrementalHealth,
  };
}

function tiedRow(point: Point, twin: IncrementalRow): IncrementalRow {
  const onFrontier = twin.status === 'reference' || twin.status === 'frontier';
  return {
    ...plain(point),
    status: onFrontier ? 'frontier' : twin.status,
    noIcer: onFrontier ? 'tied' : twin.noIcer,
    dominatedBy: twin.dominatedBy,
    extendedlyDominatedBy: twin.extendedlyDominatedBy,
    tiedWith: twin.id,
  };
}

function dominator(point: Point, candidates: readonly Point[]): string {
  const found = candidates.find(
    (other) => other.cost <= point.cost && other.health >= point.health,
  ) as Point;
  return found.option.id;
}

function neighbours(point: Point, frontier: readonly Point[]): [string, string] {
  const dearer = frontier.findIndex((other) => other.cost > point.cost);
  const pair = [frontier[dearer - 1], frontier[dearer]] as [Point, Point];
  return [pair[0].option.id, pair[1].option.id];
}
