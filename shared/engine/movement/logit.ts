/**
 * Multinomial logit: p_j = exp(eta_j) / (1 + sum of exp(eta)), eta the log odds
 * against the reference destination. The largest eta is taken off first, so that no
 * exponential overflows.
 */
import type { Row } from '../../model/document.ts';
import type { Graph, NodeId } from '../graph.ts';
import { type Chance, cellPath, type RowPlace } from './row.ts';

type LogitRow = Extract<Row, { basis: 'logit' }>;

/** Beyond this a predictor is a slip of the pen (and exp of its negative is 0). */
const LARGEST_LOG_ODDS = 1e6;

export function logitChances(at: RowPlace<LogitRow>): Chance[] {
  const { row, lowering, place, check } = at;
  const predictors = row.cells.map((cell, index) => {
    const node = lowering.formula(cell.formula, place);
    const bounds = { low: -LARGEST_LOG_ODDS, high: LARGEST_LOG_ODDS };
    check({ node, ...bounds, code: 'run.logOddsOutside', path: cellPath(at, index) });
    return node;
  });
  const [reference, ...others] = softmax(lowering.graph, predictors);
  const cells = row.cells.map((cell, index) => ({
    to: at.stateIndex(cell.to),
    chance: others[index] as NodeId,
  }));
  return [...cells, { to: at.stateIndex(row.reference), chance: reference as NodeId }];
}

/** Chances of the reference (log odds 0) and of each other destination. */
function softmax(graph: Graph, predictors: readonly NodeId[]): NodeId[] {
  const zero = graph.constant(0);
  const largest = predictors.reduce((top, node) => graph.binary('max', top, node), zero);
  const odds = [zero, ...predictors].map((node) =>
    graph.unary('exp', graph.binary('subtract', node, largest)),
  );
  const total = graph.sum(odds);
  return odds.map((odd) => graph.binary('divide', odd, total));
}
