/**
 * The one way in for a document: from text (file, import, command line) or from a
 * parsed value (editor, another thread). Never throws on any text; time is linear
 * in the text's length.
 */
import { documentSchema, FORMAT, FORMAT_VERSION, type ModelDocument } from './document.ts';
import { error, hasErrors, type Issue, type Path } from './issue.ts';
import { jsonFaultAt, placeOf } from './json-fault.ts';
import { MAX_BYTES, MAX_DEPTH, MAX_ISSUES } from './limits.ts';
import { MIGRATIONS, type Migration, migrate, type PlainObject } from './migrate.ts';
import { plainIssues } from './plain.ts';
import { checkReferences } from './references.ts';
import { schemaIssue, typeName } from './schema-issues.ts';
import { shapeIssues } from './shape.ts';
import { tooDeepAt } from './text-depth.ts';

/** `document` is there if and only if no issue is an error. */
export type ReadResult =
  | { readonly document: ModelDocument; readonly issues: readonly Issue[] }
  | {
      readonly document: null;
      /**
       * The document where its shape is sound and only its references are not: for an
       * editor to show and mend, never to run.
       */
      readonly draft: ModelDocument | null;
      readonly issues: readonly Issue[];
    };

/** Reads a document from its JSON text. A byte order mark at the start is passed over. */
export function readDocument(text: string): ReadResult {
  if (isTooLarge(text)) return refused([error('document.tooLarge', [], { maximum: MAX_BYTES })]);
  const json = text.startsWith('\uFEFF') ? text.slice(1) : text;
  const deep = tooDeep(json);
  if (deep) return refused([deep]);
  try {
    return checkDocument(JSON.parse(json));
  } catch (thrown) {
    if (thrown instanceof SyntaxError) return refused([notJson(json)]);
    throw thrown;
  }
}

/** Checks a value that is already parsed; `migrations` is given by tests only. */
export function checkDocument(
  value: unknown,
  migrations: readonly Migration[] = MIGRATIONS,
): ReadResult {
  const unsafe = plainIssues(value);
  if (unsafe.length > 0) return refused(unsafe);
  const current = atCurrentVersion(value, migrations);
  if (current.issue) return refused([current.issue]);
  const shape = shapeIssues(documentSchema, current.value, MAX_ISSUES + 1);
  if (shape.length > 0) return refused(shape);
  const parsed = documentSchema.safeParse(current.value);
  if (!parsed.success) {
    return refused(
      parsed.error.issues.map((issue) =>
        schemaIssue(issue, valueAt(current.value, issue.path), issue.path as Path),
      ),
    );
  }
  const issues = capped(checkReferences(parsed.data));
  if (hasErrors(issues)) return { document: null, draft: parsed.data, issues };
  return { document: parsed.data, issues };
}

function refused(issues: readonly Issue[]): ReadResult {
  return { document: null, draft: null, issues: capped(issues) };
}

/** The first MAX_ISSUES, errors before warnings, and a word on the rest. */
function capped(issues: readonly Issue[]): Issue[] {
  if (issues.length <= MAX_ISSUES) return [...issues];
  const errors = issues.filter((issue) => issue.severity === 'error');
  const warnings = issues.filter((issue) => issue.severity === 'warning');
  const first = [...errors, ...warnings].slice(0, MAX_ISSUES);
  return [...first, error('document.moreIssues', [], { shown: MAX_ISSUES })];
}

function isTooLarge(text: string): boolean {
  if (text.length > MAX_BYTES) return true;
  // A UTF-16 unit takes at most three bytes in UTF-8: count only where it can matter.
  return text.length * 3 > MAX_BYTES && new TextEncoder().encode(text).length > MAX_BYTES;
}

function tooDeep(json: string): Issue | null {
  const at = tooDeepAt(json);
  if (at < 0) return null;
  return error('document.tooDeep', [], { maximum: MAX_DEPTH, ...placeOf(json, at) });
}

function notJson(json: string): Issue {
  return error('document.notJson', [], { ...placeOf(json, jsonFaultAt(json)) });
}

type Versioned = { value: PlainObject; issue: null } | { value: null; issue: Issue };

/** The value in today's format: refused where another format or a newer version, else migrated. */
function atCurrentVersion(value: unknown, migrations: readonly Migration[]): Versioned {
  if (typeName(value) !== 'object') {
    return { value: null, issue: error('document.notObject', [], { got: typeName(value) }) };
  }
  const { format, formatVersion: version } = value as PlainObject;
  if (format !== FORMAT) {
    return { value: null, issue: error('document.wrongFormat', ['format'], { expected: FORMAT }) };
  }
  if (typeof version !== 'number' || !Number.isInteger(version) || version < 1) {
    return { value: null, issue: error('document.badVersion', ['formatVersion']) };
  }
  const params = { got: version, known: FORMAT_VERSION };
  if (version > FORMAT_VERSION) {
    return { value: null, issue: error('document.newerFormat', ['formatVersion'], params) };
  }
  return migrate(value as PlainObject, version, FORMAT_VERSION, migrations);
}

function valueAt(value: unknown, path: readonly PropertyKey[]): unknown {
  return path.reduce<unknown>(
    (here, key) => (here as Record<PropertyKey, unknown> | null | undefined)?.[key],
    value,
  );
}
