/** A parameter for tests: its symbol is its id. */
import type { Distribution, Parameter } from '../../../shared/model/document.ts';

export function parameter(
  id: string,
  distribution: Distribution,
  value = 0.5,
  kind: Parameter['kind'] = 'number',
): Parameter {
  const source = { citation: 'Invented for a test', invented: true };
  return { id, symbol: id, label: id, unit: '', kind, value, distribution, source };
}
