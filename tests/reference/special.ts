/**
 * The two functions of analysis that survival curves need, written slowly from
 * their series, so that the reference shares no code with the engine.
 * Series and continued fractions: Abramowitz and Stegun 1964, 6.5.29, 6.5.31 and
 * 26.2.11 (from memory).
 */

const TERMS = 300;

/** Chance that a standard normal is at most x; relative accuracy about 1e-13. */
export function normalCdf(x: number): number {
  if (x < -2) return 0.5 * upperGamma(0.5, (x * x) / 2);
  if (x > 2) return 1 - 0.5 * upperGamma(0.5, (x * x) / 2);
  let term = x;
  let sum = x;
  for (let n = 1; n < TERMS; n++) {
    term *= (x * x) / (2 * n + 1);
    sum += term;
  }
  return 0.5 + (sum * Math.exp((-x * x) / 2)) / Math.sqrt(2 * Math.PI);
}

/** Regularised lower incomplete gamma function P(a, x). */
export function lowerGamma(a: number, x: number): number {
  if (x <= 0) return 0;
  return x < a + 1 ? lowerSeries(a, x) : 1 - upperFraction(a, x);
}

/** Regularised upper incomplete gamma function Q(a, x). */
export function upperGamma(a: number, x: number): number {
  if (x <= 0) return 1;
  return x < a + 1 ? 1 - lowerSeries(a, x) : upperFraction(a, x);
}

function lowerSeries(a: number, x: number): number {
  let term = 1 / a;
  let sum = term;
  for (let n = 1; n < TERMS; n++) {
    term *= x / (a + n);
    sum += term;
  }
  return sum * Math.exp(a * Math.log(x) - x - logGamma(a));
}

/** Continued fraction taken from its far end inwards. */
function upperFraction(a: number, x: number): number {
  let tail = 0;
  for (let n = TERMS; n >= 1; n--) tail = (n * (n - a)) / (x + 2 * n + 1 - a - tail);
  return Math.exp(a * Math.log(x) - x - logGamma(a)) / (x + 1 - a - tail);
}

/** Stirling's series after moving the argument above 15. */
function logGamma(a: number): number {
  let shift = 0;
  let z = a;
  for (; z < 15; z++) shift += Math.log(z);
  const series =
    1 / (12 * z) -
    1 / (360 * z ** 3) +
    1 / (1260 * z ** 5) -
    1 / (1680 * z ** 7) +
    1 / (1188 * z ** 9);
  return (z - 0.5) * Math.log(z) - z + 0.5 * Math.log(2 * Math.PI) + series - shift;
}
