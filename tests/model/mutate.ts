/** Seeded damage to JSON values: what a careless editor, a bad disk or an enemy does to a file. */

type Json = null | boolean | number | string | Json[] | { [key: string]: Json };
type Keyed = Record<string | number, Json>;
interface Spot {
  readonly parent: Keyed;
  readonly key: string | number;
}

const ODD_VALUES: readonly Json[] = [
  null,
  true,
  false,
  0,
  -1,
  1e308,
  -1e308,
  5e-324,
  0.5,
  4_294_967_296,
  9_007_199_254_740_991,
  '',
  'NaN',
  'Infinity',
  '-0',
  'x'.repeat(5_000),
  '\ud83d\ude02',
  'toString',
  'hasOwnProperty',
  '1 +',
  'if(',
  [],
  {},
  [[]],
  [null],
  { type: 'normal' },
  { type: 'rows', rows: [] },
  { byStrategy: {} },
  { byStrategy: { usual: '1' } },
];

const HOSTILE = ['__proto__', 'constructor', 'prototype'];

/** Mulberry32, a public-domain generator: small, and the same everywhere. */
function generator(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4_294_967_296;
  };
}

export class Mutator {
  private readonly random: () => number;
  constructor(seed: number) {
    this.random = generator(seed);
  }

  /** A copy of `document` with one to four things changed. */
  mutated(document: unknown): unknown {
    const root = structuredClone(document) as Keyed;
    const changes = 1 + this.below(4);
    for (let change = 0; change < changes; change += 1) this.change(root);
    return root;
  }

  /** JSON text of a mutated copy; now and then cut off, or with a stretch overwritten. */
  mutatedText(document: unknown): string {
    const text = JSON.stringify(this.mutated(document));
    const dice = this.random();
    const at = this.below(text.length);
    if (dice < 0.1) return text.slice(0, at);
    if (dice < 0.15) return text.slice(0, at) + text.slice(at + 1 + this.below(20));
    if (dice < 0.2)
      return `${text.slice(0, at)}${this.pick(['"', '{', ']', '\\', '1e999', ','])}${text.slice(at)}`;
    return text;
  }

  below(limit: number): number {
    return Math.floor(this.random() * limit);
  }

  pick<T>(list: readonly T[]): T {
    return list[this.below(list.length)]!;
  }

  private change(root: Keyed): void {
    const spots = spotsOf(root);
    if (spots.length === 0) return;
    const spot = this.pick(spots);
    this.pick([
      this.remove,
      this.replace,
      this.replace,
      this.nudge,
      this.duplicate,
      this.move,
      this.swap,
      this.nest,
      this.poison,
      this.rename,
      this.decorate,
      this.decorate,
    ]).call(this, spot, spots);
  }

  private remove({ parent, key }: Spot): void {
    if (Array.isArray(parent)) parent.splice(Number(key), 1);
    else delete parent[key];
  }

  private replace({ parent, key }: Spot): void {
    parent[key] = structuredClone(this.pick(ODD_VALUES));
  }

  /** A number a little or wildly off, a text with a character more. */
  private nudge({ parent, key }: Spot): void {
    const value = parent[key];
    if (typeof value === 'number') parent[key] = this.pick([value * 1.01, -value, value * 1e9]);
    else if (typeof value === 'string') parent[key] = value + this.pick(['x', ' ', '_2', '\u0000']);
  }

  private duplicate({ parent, key }: Spot): void {
    if (Array.isArray(parent)) parent.push(structuredClone(parent[Number(key)]!));
    else parent[`${key}2`] = structuredClone(parent[key]!);
  }

  private move(spot: Spot, spots: readonly Spot[]): void {
    const target = this.pick(spots);
    const value = structuredClone(spot.parent[spot.key]!);
    this.remove(spot);
    target.parent[target.key] = value;
  }

  private swap({ parent, key }: Spot, spots: readonly Spot[]): void {
    const other = this.pick(spots);
    const mine = structuredClone(parent[key]!);
    parent[key] = structuredClone(other.parent[other.key]!);
    other.parent[other.key] = mine;
  }

  private nest({ parent, key }: Spot): void {
    const depth = this.pick([1, 2, 60, 70, 500]);
    let value = structuredClone(parent[key]!);
    for (let level = 0; level < depth; level += 1)
      value = this.random() < 0.5 ? [value] : { value };
    parent[key] = value;
  }

  private poison({ parent, key }: Spot): void {
    const hostile = this.pick(HOSTILE);
    const target = parent[key];
    if (typeof target === 'string') parent[key] = hostile;
    else if (typeof target === 'object' && target !== null && !Array.isArray(target)) {
      Object.defineProperty(target, hostile, {
        value: { bad: 1 },
        enumerable: true,
        writable: true,
        configurable: true,
      });
    }
  }

  private rename({ parent, key }: Spot): void {
    if (Array.isArray(parent)) return;
    const value = parent[key]!;
    delete parent[key];
    parent[this.pick([`${key}_`, key.toString().toUpperCase(), 'toString', ''])] = value;
  }

  /** A field of a version to come: has to be let through. */
  private decorate({ parent }: Spot): void {
    if (!Array.isArray(parent)) parent.addedLater = { since: 2, values: [1, 'two', null] };
  }
}

/** Every place in a value, children after parents. */
function spotsOf(root: Keyed): Spot[] {
  const spots: Spot[] = [];
  const pending: Keyed[] = [root];
  for (let parent = pending.pop(); parent && spots.length < 20_000; parent = pending.pop()) {
    const keys = Array.isArray(parent) ? parent.map((_, index) => index) : Object.keys(parent);
    for (const key of keys) {
      spots.push({ parent, key });
      const value = parent[key];
      if (typeof value === 'object' && value !== null) pending.push(value as Keyed);
    }
  }
  return spots;
}
