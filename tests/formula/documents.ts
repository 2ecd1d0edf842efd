/** Documents for the tests of this folder: the tiny one with parts put in place of its own. */
import type { ModelDocument, Parameter } from '../../shared/model/document.ts';
import type { Kind } from '../../shared/model/kinds.ts';
import { tinyDocument } from '../fixtures/tiny-document.ts';

/** A parameter that is known, of a kind, at a value that the kind allows. */
export function parameter(symbol: string, kind: Kind, value = 0.5): Parameter {
  return {
    id: symbol,
    symbol,
    label: symbol,
    unit: '',
    kind,
    value,
    distribution: { type: 'fixed' },
    source: { citation: 'Invented for a test', invented: true },
  };
}

export type VariableList = ModelDocument['variables'];

/** Variables without declared kinds, by symbol. */
export function variables(
  formulas: Record<string, VariableList[number]['formula']>,
  kinds: Record<string, Kind> = {},
): VariableList {
  return Object.entries(formulas).map(([symbol, formula]) => {
    const kind = kinds[symbol];
    return { id: symbol, symbol, label: symbol, formula, ...(kind ? { kind } : {}) };
  });
}

export function table(
  symbol: string,
  keys: 1 | 2 = 1,
  kind?: Kind,
): ModelDocument['tables'][number] {
  const key = { label: 'key', points: [0, 1] };
  return {
    id: `id_${symbol}`,
    symbol,
    label: symbol,
    keys: keys === 1 ? [key] : [key, key],
    values: keys === 1 ? [0, 1] : [0, 1, 0, 1],
    interpolation: 'step',
    ...(kind ? { kind } : {}),
  };
}

/** One parameter of every kind, named after it in short. */
export const EVERY_KIND: Parameter[] = [
  parameter('p', 'probability'),
  parameter('q', 'probability'),
  parameter('r', 'rate'),
  parameter('per_cycle', 'perCycle'),
  parameter('ratio', 'ratio'),
  parameter('lor', 'logOdds'),
  parameter('u', 'utility'),
  parameter('dw', 'disabilityWeight'),
  parameter('c_year', 'costPerYear'),
  parameter('c_cycle', 'costPerCycle'),
  parameter('c_once', 'costOnce'),
  parameter('price', 'money'),
  parameter('years', 'time'),
  parameter('visits', 'count'),
  parameter('n', 'number'),
];

export function documentWith(overrides: Partial<ModelDocument>): ModelDocument {
  return tinyDocument(overrides);
}
