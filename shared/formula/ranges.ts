/** The values that a kind can take, and whether a document's numbers keep to them. */
import type { Distribution, ModelDocument, Parameter } from '../model/document.ts';
import { error, type Issue, type IssueParams, type Path, warning } from '../model/issue.ts';
import type { Kind } from '../model/kinds.ts';

export interface Range {
  readonly low: number;
  readonly high: number;
}

const ANY: Range = { low: Number.NEGATIVE_INFINITY, high: Number.POSITIVE_INFINITY };
const NOT_NEGATIVE: Range = { low: 0, high: Number.POSITIVE_INFINITY };
const UNIT: Range = { low: 0, high: 1 };

/** Utilities may lie below 0 (states worse than death), never above 1. */
const RANGES: Partial<Record<Kind, Range>> = {
  probability: UNIT,
  disabilityWeight: UNIT,
  utility: { low: Number.NEGATIVE_INFINITY, high: 1 },
  rate: NOT_NEGATIVE,
  perCycle: NOT_NEGATIVE,
  count: NOT_NEGATIVE,
};

/** A range as an issue's params: bounds that there are. */
export function boundsOf({ low, high }: Range): IssueParams {
  return {
    ...(Number.isFinite(low) ? { low } : {}),
    ...(Number.isFinite(high) ? { high } : {}),
  };
}

export const rangeOf = (kind: Kind): Range => RANGES[kind] ?? ANY;

function checkValue(value: number, kind: Kind, path: Path): Issue[] {
  const { low, high } = rangeOf(kind);
  if (value >= low && value <= high) return [];
  return [error('values.outsideKind', path, { kind, value, ...boundsOf({ low, high }) })];
}

/** Standard deviations from the mean that a draw may reach and be expected (1 in 16,000 beyond). */
const REACH = 4;

/** Where nearly all draws fall; undefined where it takes more than a line to say. */
function reachOf(distribution: Distribution): Range | undefined {
  switch (distribution.type) {
    case 'normal': {
      const { mean, sd } = distribution;
      return { low: mean - REACH * sd, high: mean + REACH * sd };
    }
    case 'lognormal': {
      const { meanlog, sdlog } = distribution;
      return { low: 0, high: Math.exp(meanlog + REACH * sdlog) };
    }
    case 'gamma': {
      const { shape, scale } = distribution;
      return { low: 0, high: scale * (shape + REACH * Math.sqrt(shape)) };
    }
    case 'beta':
      return UNIT;
    case 'uniform':
    case 'triangular':
    case 'pert':
      return { low: distribution.low, high: distribution.high };
    default:
      return undefined;
  }
}

function checkReach({ distribution, kind }: Parameter, path: Path): Issue[] {
  const reach = reachOf(distribution);
  const { low, high } = rangeOf(kind);
  if (!reach || (reach.low >= low && reach.high <= high)) return [];
  const params = { kind, distribution: distribution.type, ...boundsOf({ low, high }) };
  return [warning('values.drawsOutsideKind', path, params)];
}

/** A table is reported once, at its first value out of range. */
function checkTable({ values, kind }: ModelDocument['tables'][number], path: Path): Issue[] {
  if (!kind) return [];
  const { low, high } = rangeOf(kind);
  const at = values.findIndex((value) => value < low || value > high);
  return at < 0 ? [] : checkValue(values[at] ?? 0, kind, [...path, at]);
}

function checkScenarioValues(document: ModelDocument): Issue[] {
  const kinds = new Map(document.parameters.map(({ id, kind }) => [id, kind]));
  return document.scenarios.flatMap(({ overrides }, index) =>
    overrides.flatMap((override, at) => {
      const kind = override.type === 'parameter' ? kinds.get(override.parameter) : undefined;
      if (override.type !== 'parameter' || !kind) return [];
      return checkValue(override.value, kind, ['scenarios', index, 'overrides', at, 'value']);
    }),
  );
}

/**
 * Values that their kind cannot take: `values.outsideKind` (error; params kind, value,
 * low and high where bounded) of parameters, tables and scenarios; `values.drawsOutsideKind` (warning;
 * kind, distribution, low, high) of distributions that reach beyond.
 */
export function checkValues(document: ModelDocument): Issue[] {
  return [
    ...document.parameters.flatMap((parameter, index) => {
      const { value, kind } = parameter;
      const issues = checkValue(value, kind, ['parameters', index, 'value']);
      return [...issues, ...checkReach(parameter, ['parameters', index, 'distribution'])];
    }),
    ...document.tables.flatMap((table, index) => checkTable(table, ['tables', index, 'values'])),
    ...checkScenarioValues(document),
  ];
}
