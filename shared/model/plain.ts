import { error, type Issue, type IssueParams, type Path } from './issue.ts';
import { MAX_DEPTH, MAX_ISSUES, MAX_KEYS, MAX_VALUES } from './limits.ts';
import { HOSTILE_KEYS } from './names.ts';

type Key = string | number;

/** A list or object still to be looked into, and where it stands. */
interface Container {
  readonly value: object;
  readonly key: Key;
  readonly parent: Container | null;
  readonly depth: number;
}

/**
 * What keeps a value from being plain JSON that is safe to work on: nesting past
 * MAX_DEPTH, keys that reach into JavaScript objects, numbers that are not finite,
 * text with half a surrogate pair (RFC 8785 has no canonical form for it), values
 * that JSON does not know. `undefined` passes: an optional field left empty.
 * Iterative and bounded, so values that share or contain themselves end too.
 */
export function plainIssues(root: unknown): Issue[] {
  const walk = new Walk();
  walk.part(root, '', null);
  for (let next = walk.pending.pop(); next && !walk.done; next = walk.pending.pop()) {
    walk.open(next);
  }
  return walk.issues;
}

class Walk {
  readonly issues: Issue[] = [];
  readonly pending: Container[] = [];
  private values = 0;
  private exhausted = false;

  get done(): boolean {
    return this.exhausted || this.issues.length > MAX_ISSUES;
  }

  open(container: Container): void {
    const { value } = container;
    const keyed = value as Record<string, unknown>;
    if (Array.isArray(value)) {
      for (let i = 0; i < value.length && !this.done; i += 1) this.part(value[i], i, container);
      return;
    }
    const keys = Object.keys(value);
    if (keys.length > MAX_KEYS) {
      this.add('document.tooManyKeys', container.key, container.parent, { maximum: MAX_KEYS });
      return;
    }
    for (const key of keys) {
      if (this.done) return;
      if (HOSTILE_KEYS.has(key)) this.add('document.hostileKey', key, container, { key });
      else if (!isWellFormed(key)) this.add('document.brokenText', container.key, container.parent);
      else this.part(keyed[key], key, container);
    }
  }

  /** Judges one value; lists and objects wait their turn. */
  part(value: unknown, key: Key, parent: Container | null): void {
    this.values += 1;
    if (this.values > MAX_VALUES) this.exhaust();
    else if (typeof value === 'object' && value !== null) this.container(value, key, parent);
    else if (typeof value === 'number') {
      if (!Number.isFinite(value)) this.add('document.numberNotFinite', key, parent);
    } else if (typeof value === 'string') {
      if (!isWellFormed(value)) this.add('document.brokenText', key, parent);
    } else if (value !== null && value !== undefined && typeof value !== 'boolean') {
      this.add('document.notPlain', key, parent, { got: typeof value });
    }
  }

  private container(value: object, key: Key, parent: Container | null): void {
    const depth = (parent?.depth ?? 0) + 1;
    if (depth > MAX_DEPTH) this.add('document.tooDeep', key, parent, { maximum: MAX_DEPTH });
    else if (isPlain(value)) this.pending.push({ value, key, parent, depth });
    else this.add('document.notPlain', key, parent, { got: 'object' });
  }

  private exhaust(): void {
    this.exhausted = true;
    this.issues.push(error('document.tooManyValues', [], { maximum: MAX_VALUES }));
  }

  private add(code: string, key: Key, parent: Container | null, params?: IssueParams): void {
    this.issues.push(error(code, parent ? pathOf(parent, key) : [], params));
  }
}

function isPlain(value: object): boolean {
  if (Array.isArray(value)) return true;
  const prototype: object | null = Object.getPrototypeOf(value);
  if (prototype === Object.prototype || prototype === null) return true;
  // Another realm's Object.prototype (a test's sandbox) is plain too.
  return Object.getPrototypeOf(prototype) === null;
}

const LONE_SURROGATE = /\p{Surrogate}/u;

function isWellFormed(text: string): boolean {
  return !LONE_SURROGATE.test(text);
}

function pathOf(parent: Container, key: Key): Path {
  const path: Key[] = [key];
  for (let here = parent; here.parent; here = here.parent) path.push(here.key);
  return path.reverse();
}
