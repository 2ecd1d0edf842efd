/** A small seeded source of chance for making test models (splitmix32, from memory). */
export class Seeded {
  private state: number;

  constructor(seed: number) {
    this.state = seed | 0;
  }

  /** Uniform on [0, 1). */
  next(): number {
    this.state = (this.state + 0x9e3779b9) | 0;
    let z = this.state;
    z = Math.imul(z ^ (z >>> 16), 0x21f0aaad);
    z = Math.imul(z ^ (z >>> 15), 0x735a2d97);
    return ((z ^ (z >>> 15)) >>> 0) / 4294967296;
  }

  /** A whole number from `low` to `high`, both included. */
  whole(low: number, high: number): number {
    return low + Math.floor(this.next() * (high - low + 1));
  }

  /** A number between, of at most four significant digits. */
  between(low: number, high: number): number {
    return Number((low + this.next() * (high - low)).toPrecision(4));
  }

  happens(chance: number): boolean {
    return this.next() < chance;
  }

  pick<T>(list: readonly T[]): T {
    return list[this.whole(0, list.length - 1)] as T;
  }

  /** `count` different elements, in the order of the list. */
  some<T>(list: readonly T[], count: number): T[] {
    const keys = list.map((_, i) => ({ i, key: this.next() })).sort((a, b) => a.key - b.key);
    const chosen = new Set(keys.slice(0, count).map(({ i }) => i));
    return list.filter((_, i) => chosen.has(i));
  }

  /** At least one element. */
  someOrAll<T>(list: readonly T[]): T[] {
    return this.some(list, this.whole(1, list.length));
  }

  /** `count` positive numbers that sum to `total` or a little less. */
  parts(count: number, total: number): number[] {
    const weights = Array.from({ length: count }, () => 0.1 + this.next());
    const sum = weights.reduce((a, b) => a + b, 0);
    return weights.map((weight) => Math.floor((weight / sum) * total * 10_000) / 10_000);
  }
}
