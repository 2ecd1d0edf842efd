import type { ModelDocument } from '../../../shared/model/document.ts';
import type { Entry } from './entry.ts';

/**
 * What the document names, each leading to the place where it is edited.
 * @param go goes to an address within the appraisal, to the thing there with that id
 */
export function documentEntries(
  document: Pick<ModelDocument, 'parameters' | 'states' | 'variables' | 'strategies'>,
  go: (to: string, id: string) => void,
): Entry[] {
  const entry = (kind: Entry['kind'], to: string) => (one: Named) => ({
    id: `${kind}-${one.id}`,
    kind,
    name: one.label === '' ? (one.symbol ?? '') : one.label,
    symbol: one.symbol,
    act: () => go(kind === 'parameter' ? `${to}?parameter=${one.id}` : to, one.id),
  });
  return [
    ...document.parameters.map(entry('parameter', 'evidence')),
    ...document.states.map(entry('state', 'model/states')),
    ...document.variables.map(entry('variable', 'model/variables')),
    ...document.strategies.map(entry('strategy', 'question')),
  ];
}

interface Named {
  readonly id: string;
  readonly label: string;
  readonly symbol?: string;
}
