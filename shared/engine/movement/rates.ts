/**
 * Competing yearly rates, made into the probabilities of one cycle.
 *
 * By row: the competing-risks formula, p_j = r_j / R (1 - exp(-R t)). By generator:
 * the matrix exponential of all rows of rates together, so that two moves within a
 * cycle are counted (Welton and Ades 2005). States whose rows have another basis
 * have no rates in the generator: one who arrives there stays for the rest of the
 * cycle. In a tunnel, the row stands at its own time in state and the other timed
 * states' rows at arrival.
 */
import type { Row } from '../../model/document.ts';
import type { NodeId } from '../graph.ts';
import { type Chance, cellPath, type RowPlace } from './row.ts';

type RateRow = Extract<Row, { basis: 'rates' }>;

/** Rates of one row by destination. */
interface Rates {
  readonly from: number;
  readonly cells: readonly { readonly to: number; readonly rate: NodeId }[];
}

function ratesOf(at: RowPlace<RateRow>): Rates {
  const { row, lowering, place, check } = at;
  const cells = row.cells.map((cell, index) => {
    const rate = lowering.formula(cell.formula, place);
    const bounds = { low: 0, high: Number.MAX_VALUE };
    check({ node: rate, ...bounds, code: 'run.rateOutside', path: cellPath(at, index) });
    return { to: at.stateIndex(cell.to), rate };
  });
  return { from: at.stateIndex(row.from), cells };
}

/** The competing-risks formula for one row alone. */
export function chancesByRow(at: RowPlace<RateRow>): Chance[] {
  return competingRisks(at, ratesOf(at));
}

function competingRisks(at: RowPlace<RateRow>, { from, cells }: Rates): Chance[] {
  const { graph } = at.lowering;
  const years = at.lowering.formula('cycle_length', at.place);
  const total = graph.sum(cells.map(({ rate }) => rate));
  const exposure = graph.binary('exposure', total, years);
  const moves = cells.map(({ to, rate }) => ({
    to,
    chance: graph.binary('multiply', rate, exposure),
  }));
  const leave = graph.unary('negate', graph.binary('multiply', total, years));
  return [...moves, { to: from, chance: graph.unary('exp', leave) }];
}

/**
 * The row's share of the exponential of the whole generator.
 * @param others the strategy's other generator rows, timed ones at arrival
 */
export function chancesByGenerator(
  at: RowPlace<RateRow>,
  others: readonly RowPlace<RateRow>[],
): Chance[] {
  const own = ratesOf(at);
  const rows = reachable(own, others.map(ratesOf));
  if (rows.length === 1) return competingRisks(at, own);
  const states = [...new Set(rows.flatMap((row) => [row.from, ...row.cells.map((c) => c.to)]))];
  const places = rows.flatMap((row) =>
    row.cells.map(({ to }) => [states.indexOf(row.from), states.indexOf(to)] as const),
  );
  const rates = rows.flatMap((row) => row.cells.map(({ rate }) => rate));
  const years = at.lowering.graph.valueOf(at.lowering.formula('cycle_length', at.place)) as number;
  const chances = at.lowering.graph.exponential(states.length, places, rates, years);
  return states.map((to, index) => ({ to, chance: chances[index] as NodeId }));
}

/** The rows that somebody who leaves by `own` may come upon within the cycle. */
function reachable(own: Rates, others: readonly Rates[]): Rates[] {
  const rows = [own];
  for (const row of rows) {
    for (const { to } of row.cells) {
      const next = others.find(({ from }) => from === to);
      if (next && to !== own.from && !rows.includes(next)) rows.push(next);
    }
  }
  return rows;
}
