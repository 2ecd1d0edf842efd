/** Every draw as a line of CSV: its number, the uncertain parameters, costs and outcomes. */
import type { DrawsBlock } from '../engine/results.ts';
import type { ModelDocument } from '../model/document.ts';

/**
 * @param values parameter draws by parameter id
 * @returns lines with a head; numbers in full (shortest text that reads back the same)
 */
export function drawsCsv(
  document: ModelDocument,
  values: ReadonlyMap<string, Float64Array>,
  draws: DrawsBlock,
): string {
  const uncertain = document.parameters.filter(({ distribution }) => distribution.type !== 'fixed');
  const { strategies } = document;
  const head = [
    'draw',
    ...uncertain.map(({ symbol }) => symbol),
    ...strategies.map(({ id }) => `cost_${id}`),
    ...strategies.map(({ id }) => `outcome_${id}`),
  ];
  const columns = [
    ...uncertain.map(({ id }) => values.get(id) as Float64Array),
    ...draws.cost,
    ...draws.outcome,
  ];
  const lines = Array.from({ length: draws.to - draws.from }, (_, i) =>
    [draws.from + i + 1, ...columns.map((column) => column[i])].join(','),
  );
  return `${[head.join(','), ...lines].join('\n')}\n`;
}
