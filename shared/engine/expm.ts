/**
 * Rows of exp(Q t), the transition probabilities of a continuous-time Markov chain
 * with generator Q over t years, by uniformisation (Jensen 1953; from memory):
 *
 *   exp(Q t) = sum over k of Poisson(k; q t) (I + Q / q)^k,   q = the largest exit rate
 *
 * Every term is non-negative, so nothing cancels: errors stay near one unit in the
 * last place of each probability. Long times are halved until q t is small enough
 * for exp(-q t) not to vanish, then squared back.
 */

/** Largest q t that is summed directly; about 60 terms. */
const LARGEST_STEP = 20;

/** Where the Poisson weights that are left can no longer change a sum of 1. */
const NEGLIGIBLE = 1e-18;

/** A generator's off-diagonal rates by place; exit rates follow. */
export class Exponential {
  private readonly size: number;
  private readonly from: Int32Array;
  private readonly to: Int32Array;
  private readonly exits: Float64Array;
  private readonly result: Float64Array;
  private readonly work: Float64Array;
  private readonly term: Float64Array;
  private readonly next: Float64Array;

  /** @param places row and column (0-based, row not column) of each rate */
  constructor(size: number, places: readonly (readonly [number, number])[]) {
    this.size = size;
    this.from = Int32Array.from(places, ([row]) => row);
    this.to = Int32Array.from(places, ([, column]) => column);
    this.exits = new Float64Array(size);
    this.result = new Float64Array(size * size);
    this.work = new Float64Array(size * size);
    this.term = new Float64Array(size);
    this.next = new Float64Array(size);
  }

  /**
   * exp(Q years), row by row.
   * @param rates one a place, per year, 0 or more (NaN and infinities give NaN)
   * @param only the one row wanted, where not all are: the others are then undefined
   * @returns a matrix that the next call overwrites
   */
  compute(rates: Float64Array, years: number, only?: number): Float64Array {
    const fastest = this.sumExits(rates);
    const { size, result } = this;
    if (!(fastest * years < Number.MAX_VALUE)) return result.fill(Number.NaN);
    if (fastest === 0) return identity(result, size);
    const halvings = Math.max(0, Math.ceil(Math.log2((fastest * years) / LARGEST_STEP)));
    const step = years / 2 ** halvings;
    for (let row = 0; row < size; row++) {
      if (only === undefined || row === only || halvings > 0) {
        this.sumRow(row, rates, fastest, step);
      }
    }
    for (let k = 0; k < halvings; k++) this.square();
    return result;
  }

  private sumExits(rates: Float64Array): number {
    const { exits, from } = this;
    exits.fill(0);
    let fastest = 0;
    for (let k = 0; k < from.length; k++) {
      const exit = exits[from[k]!]! + rates[k]!;
      exits[from[k]!] = exit;
      if (!(exit <= fastest)) fastest = exit;
    }
    return fastest;
  }

  /** Adds up the Poisson-weighted powers of the row's unit vector. */
  private sumRow(row: number, rates: Float64Array, fastest: number, years: number): void {
    const { size, result, term } = this;
    const base = row * size;
    const mean = fastest * years;
    let weight = Math.exp(-mean);
    term.fill(0);
    term[row] = 1;
    for (let j = 0; j < size; j++) result[base + j] = weight * term[j]!;
    for (let k = 1; k <= mean || weight > NEGLIGIBLE; k++) {
      this.stepTerm(rates, fastest);
      weight *= mean / k;
      for (let j = 0; j < size; j++) result[base + j] = result[base + j]! + weight * term[j]!;
    }
  }

  /** term = term (I + Q / q) */
  private stepTerm(rates: Float64Array, fastest: number): void {
    const { size, term, next, exits, from, to } = this;
    for (let j = 0; j < size; j++) next[j] = term[j]! * (1 - exits[j]! / fastest);
    for (let k = 0; k < from.length; k++) {
      const j = to[k]!;
      next[j] = next[j]! + (term[from[k]!]! * rates[k]!) / fastest;
    }
    term.set(next);
  }

  /** Rows are brought back to a sum of 1 each time: squaring would double what rounding left. */
  private square(): void {
    const { size, result, work } = this;
    work.fill(0);
    for (let i = 0; i < size; i++) {
      for (let k = 0; k < size; k++) {
        const left = result[i * size + k]!;
        if (left === 0) continue;
        for (let j = 0; j < size; j++) {
          work[i * size + j] = work[i * size + j]! + left * result[k * size + j]!;
        }
      }
    }
    for (let i = 0; i < size; i++) {
      const row = work.subarray(i * size, (i + 1) * size);
      const sum = row.reduce((total, p) => total + p, 0);
      for (let j = 0; j < size; j++) result[i * size + j] = row[j]! / sum;
    }
  }
}

function identity(matrix: Float64Array, size: number): Float64Array {
  matrix.fill(0);
  for (let i = 0; i < size; i++) matrix[i * size + i] = 1;
  return matrix;
}

/**
 * exp(Q years) of a generator given as a square matrix; its diagonal is ignored
 * (a row's exits are the sum of its rates).
 */
export function transitionMatrix(
  generator: readonly (readonly number[])[],
  years: number,
): number[][] {
  const size = generator.length;
  const places: [number, number][] = [];
  const rates: number[] = [];
  generator.forEach((line, row) => {
    line.forEach((rate, column) => {
      if (row === column || rate === 0) return;
      places.push([row, column]);
      rates.push(rate);
    });
  });
  const matrix = new Exponential(size, places).compute(Float64Array.from(rates), years);
  return Array.from({ length: size }, (_, row) => [
    ...matrix.subarray(row * size, (row + 1) * size),
  ]);
}
