import type { Table } from '../document.ts';
import { error, type Issue, type Path } from '../issue.ts';
import type { Lookups } from './lookups.ts';

/** A value for every combination of keys, and keys that rise strictly. */
export function checkTables({ document }: Lookups): Issue[] {
  return document.tables.flatMap((table, index) => checkTable(table, ['tables', index]));
}

function checkTable({ keys, values }: Table, path: Path): Issue[] {
  const issues = keys.flatMap(({ points }, index) =>
    checkRising(points, [...path, 'keys', index, 'points']),
  );
  const expected = keys.reduce((product, { points }) => product * points.length, 1);
  if (values.length !== expected) {
    const params = { expected, got: values.length };
    issues.push(error('tables.wrongSize', [...path, 'values'], params));
  }
  return issues;
}

/** The first point that is not above the one before it. */
function checkRising(points: readonly number[], path: Path): Issue[] {
  const at = points.findIndex((point, index) => index > 0 && point <= points[index - 1]!);
  if (at < 0) return [];
  return [
    error('tables.keysNotRising', [...path, at], { got: points[at]!, before: points[at - 1]! }),
  ];
}
