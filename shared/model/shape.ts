/**
 * Walks a value along its zod schema and stops at a given number of issues. zod
 * alone collects every issue before it answers, which for a hostile file of a few
 * megabytes takes many seconds and gigabytes; this walk is bounded. It also names
 * the fault inside the alternative that was meant. zod stays the judge: a value
 * that passes here is still parsed by it (see read.ts).
 */
import type { z } from 'zod';
import type { Issue, Path } from './issue.ts';
import { keyIssue, schemaIssue, typeIssue, typeName, valueIssue } from './schema-issues.ts';

type Schema = z.core.$ZodType;
type Keyed = Readonly<Record<string, unknown>>;

/** Issues of `value` against `schema`, at most `limit`. */
export function shapeIssues(schema: Schema, value: unknown, limit: number): Issue[] {
  const walk = new Walk(limit);
  walk.visit(schema, value, []);
  return walk.issues;
}

class Walk {
  readonly issues: Issue[] = [];
  constructor(private readonly limit: number) {}

  private get full(): boolean {
    return this.issues.length >= this.limit;
  }

  private add(issue: Issue): void {
    if (!this.full) this.issues.push(issue);
  }

  visit(schema: Schema, value: unknown, path: Path): void {
    if (this.full) return;
    const { def } = (schema as z.core.$ZodTypes)._zod;
    switch (def.type) {
      case 'object':
        return this.object(def, value, path);
      case 'array':
        return this.array(def, value, path);
      case 'record':
        return this.record(def, value, path);
      case 'union':
        return this.union(def, value, path);
      case 'optional':
      case 'default':
      case 'prefault':
        if (value !== undefined) this.visit(def.innerType, value, path);
        return;
      default:
        this.leaf(schema, value, path);
    }
  }

  private object(def: z.core.$ZodObjectDef, value: unknown, path: Path): void {
    if (!isKeyed(value)) return this.add(typeIssue('object', value, path));
    for (const [key, part] of Object.entries(def.shape)) {
      this.visit(part, own(value, key), [...path, key]);
    }
  }

  private array(def: z.core.$ZodArrayDef, value: unknown, path: Path): void {
    if (!Array.isArray(value)) return this.add(typeIssue('array', value, path));
    const fault = lengthFault(def, value.length);
    if (fault) return this.add(schemaIssue(fault, value, path));
    const plainNumbers = isPlainNumber(def.element);
    for (let i = 0; i < value.length && !this.full; i += 1) {
      if (plainNumbers && typeof value[i] === 'number') continue;
      this.visit(def.element, value[i], [...path, i]);
    }
  }

  private record(def: z.core.$ZodRecordDef, value: unknown, path: Path): void {
    if (!isKeyed(value)) return this.add(typeIssue('object', value, path));
    for (const key of Object.keys(value)) {
      if (this.full) return;
      if (!accepts(def.keyType, key)) this.add(keyIssue([...path, key]));
      else this.visit(def.valueType, value[key], [...path, key]);
    }
  }

  private union(def: z.core.$ZodUnionDef, value: unknown, path: Path): void {
    if ('discriminator' in def) {
      return this.discriminated(def as z.core.$ZodDiscriminatedUnionDef, value, path);
    }
    const meant = def.options.find((option) => jsonType(option) === typeName(value));
    if (meant) return this.visit(meant, value, path);
    this.add(typeIssue(def.options.map(jsonType).join(', '), value, path));
  }

  private discriminated(def: z.core.$ZodDiscriminatedUnionDef, value: unknown, path: Path): void {
    if (!isKeyed(value)) return this.add(typeIssue('object', value, path));
    const tag = own(value, def.discriminator);
    const meant = def.options.find((option) => tags(option, def.discriminator).has(tag));
    if (meant) return this.visit(meant, value, path);
    const allowed = def.options.flatMap((option) => [...tags(option, def.discriminator)]);
    this.add(valueIssue(allowed.map(String), tag, [...path, def.discriminator]));
  }

  private leaf(schema: Schema, value: unknown, path: Path): void {
    const result = (schema as z.ZodType).safeParse(value);
    for (const issue of result.error?.issues ?? []) this.add(schemaIssue(issue, value, path));
  }
}

function isKeyed(value: unknown): value is Keyed {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

function own(value: Keyed, key: string): unknown {
  return Object.hasOwn(value, key) ? value[key] : undefined;
}

function accepts(schema: Schema, value: unknown): boolean {
  return (schema as z.ZodType).safeParse(value).success;
}

/** What is wrong with a list's length, as zod would say it; the items are left alone then. */
function lengthFault(def: z.core.$ZodArrayDef, length: number): z.core.$ZodIssue | null {
  for (const check of def.checks ?? []) {
    const { def: bound } = (check as z.core.$ZodChecks)._zod;
    const origin = 'array';
    if (bound.check === 'min_length' && length < bound.minimum) {
      return { code: 'too_small', origin, minimum: bound.minimum, path: [], message: '' };
    }
    if (bound.check === 'max_length' && length > bound.maximum) {
      return { code: 'too_big', origin, maximum: bound.maximum, path: [], message: '' };
    }
  }
  return null;
}

/** Values of the discriminating field that an alternative stands for. */
function tags(option: Schema, discriminator: string): ReadonlySet<unknown> {
  return option._zod.propValues?.[discriminator] ?? new Set();
}

/** JSON's word for what an alternative of a union expects. */
function jsonType(schema: Schema): string {
  return (schema as z.core.$ZodTypes)._zod.def.type;
}

/** A number without further conditions, of which lists may hold a hundred thousand. */
function isPlainNumber(schema: Schema): boolean {
  const { def } = (schema as z.core.$ZodTypes)._zod;
  return def.type === 'number' && !def.checks?.length && !('check' in def);
}
