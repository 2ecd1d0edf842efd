/** Expectations by quadrature. */
import exp from '@stdlib/math-base-special-exp';

const STEP = 1 / 32;
const REACH = 6;

/**
 * E[f(T)] for T exponential with rate 1 and f smooth on (0, Infinity), by the double
 * exponential rule t = exp(u - exp(-u)) (Takahasi and Mori 1974).
 */
export function expectExponential(f: (t: number) => number): number {
  let sum = 0;
  for (let i = -REACH / STEP; i <= REACH / STEP; i++) {
    const u = i * STEP;
    const shrink = exp(-u);
    const t = exp(u - shrink);
    const weight = exp(-t) * t * (1 + shrink);
    if (weight > 0) sum += f(t) * weight;
  }
  return sum * STEP;
}
