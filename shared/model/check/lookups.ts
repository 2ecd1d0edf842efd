import type { ModelDocument, State } from '../document.ts';

/** A document with its parts by id, built once for all checks. */
export interface Lookups {
  readonly document: ModelDocument;
  /** In document order. */
  readonly strategies: ReadonlySet<string>;
  readonly states: ReadonlyMap<string, State>;
  readonly parameters: ReadonlyMap<string, ModelDocument['parameters'][number]>;
  readonly groups: ReadonlyMap<string, ModelDocument['groups'][number]>;
}

export function lookupsOf(document: ModelDocument): Lookups {
  return {
    document,
    strategies: new Set(document.strategies.map(({ id }) => id)),
    states: byId(document.states),
    parameters: byId(document.parameters),
    groups: byId(document.groups),
  };
}

function byId<T extends { readonly id: string }>(list: readonly T[]): Map<string, T> {
  return new Map(list.map((item) => [item.id, item]));
}
