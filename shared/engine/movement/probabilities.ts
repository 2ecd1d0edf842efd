/** A probability a destination; one destination takes what is left. */
import type { Row } from '../../model/document.ts';
import { type Chance, cellPath, type RowPlace, SLACK } from './row.ts';

type ProbabilityRow = Extract<Row, { basis: 'probabilities' }>;

/** A value outside [0, 1], the remainder's too, is reported and never clipped. */
export function probabilityChances(at: RowPlace<ProbabilityRow>): Chance[] {
  const { row, lowering, place, check } = at;
  const { graph } = lowering;
  const bounds = { low: -SLACK, high: 1 + SLACK };
  const chances = row.cells.map((cell, index) => {
    const chance = lowering.formula(cell.formula, place);
    check({ node: chance, ...bounds, code: 'run.probabilityOutside', path: cellPath(at, index) });
    return { to: at.stateIndex(cell.to), chance };
  });
  const taken = graph.sum(chances.map(({ chance }) => chance));
  const left = graph.binary('subtract', graph.constant(1), taken);
  check({ node: left, ...bounds, code: 'run.remainderOutside', path: [...at.path, 'remainder'] });
  return [...chances, { to: at.stateIndex(row.remainder), chance: left }];
}
