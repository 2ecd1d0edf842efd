import type { z } from 'zod';
import { error, type Issue, type IssueParams, type Path } from './issue.ts';

type ZodIssue = z.core.$ZodIssue;

/** Longest stretch of a wrong value that an issue quotes. */
const QUOTED = 60;

/** Turns one zod issue about `input` (the value at `path`) into ours. */
export function schemaIssue(issue: ZodIssue, input: unknown, path: Path): Issue {
  switch (issue.code) {
    case 'invalid_type':
      return typeIssue(issue.expected, input, path);
    case 'invalid_value':
      return valueIssue(issue.values.map(String), input, path);
    case 'too_small':
      return smallIssue(issue, path);
    case 'too_big':
      return bigIssue(issue, path);
    case 'invalid_format':
      return error('document.invalidFormat', path, { got: shown(input) });
    case 'invalid_key':
      return keyIssue(path);
    case 'custom':
      return error('document.hostileName', path, { got: shown(input) });
    default:
      return error('document.invalid', path, { got: shown(input) });
  }
}

/** A value of the wrong type, or none where one is needed. */
export function typeIssue(expected: string, input: unknown, path: Path): Issue {
  if (input === undefined) return error('document.missing', path, { expected });
  return error('document.invalidType', path, { expected, got: typeName(input) });
}

/** A value that is none of those allowed. */
export function valueIssue(allowed: readonly string[], input: unknown, path: Path): Issue {
  const params = { allowed: allowed.join(', '), got: shown(input) };
  if (input === undefined) return error('document.missing', path, { expected: params.allowed });
  return error('document.invalidValue', path, params);
}

/** A key of a keyed list that is no id; the key ends the path. */
export function keyIssue(path: Path): Issue {
  return error('document.invalidKey', path, { key: shown(path.at(-1)) });
}

function smallIssue(issue: z.core.$ZodIssueTooSmall, path: Path): Issue {
  const params: IssueParams = { minimum: Number(issue.minimum) };
  if (issue.origin === 'array') return error('document.tooFewItems', path, params);
  if (issue.origin === 'string') return error('document.textTooShort', path, params);
  if (issue.inclusive === false) return error('document.notAbove', path, params);
  return error('document.tooSmall', path, params);
}

function bigIssue(issue: z.core.$ZodIssueTooBig, path: Path): Issue {
  const params: IssueParams = { maximum: Number(issue.maximum) };
  if (issue.origin === 'array') return error('document.tooManyItems', path, params);
  if (issue.origin === 'string') return error('document.textTooLong', path, params);
  if (issue.inclusive === false) return error('document.notBelow', path, params);
  return error('document.tooBig', path, params);
}

/** JSON's own word for the type of a value. */
export function typeName(value: unknown): string {
  if (value === null) return 'null';
  return Array.isArray(value) ? 'array' : typeof value;
}

/** A value as an issue quotes it: short values as they are, others by their type. */
export function shown(value: unknown): string | number {
  if (typeof value === 'number') return value;
  if (typeof value === 'boolean') return String(value);
  if (typeof value !== 'string') return typeName(value);
  // Whole characters, so that no pair is cut in half.
  return value.length <= QUOTED ? value : `${Array.from(value.slice(0, QUOTED - 1)).join('')}…`;
}
