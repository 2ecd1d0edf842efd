/**
 * Regularised incomplete gamma functions P(shape, x) and Q(shape, x) and their inverse.
 *
 * @stdlib's `gammainc` is used below a shape of 100. Above, version 0.3.1 is wrong by up to
 * 2% once x passes 1,000 (checked against R's pgamma), and its inverse with it; there the
 * power series and Legendre's continued fraction are summed (Abramowitz and Stegun 1964,
 * 6.5.29 and 6.5.31; modified Lentz, Press et al. 2007, section 6.2) behind a prefactor in
 * saddle-point form, which does not cancel (Loader 2000, Fast and accurate computation of
 * binomial probabilities). Work grows with the square root of the shape.
 */
import exp from '@stdlib/math-base-special-exp';
import gammainc from '@stdlib/math-base-special-gammainc';
import gammaincinv from '@stdlib/math-base-special-gammaincinv';
import log1pmx from '@stdlib/math-base-special-log1pmx';
import normalQuantile from '@stdlib/stats-base-dists-normal-quantile';

/** From this shape on the sums of this file are used. */
const LARGE_SHAPE = 100;
const TINY = 1e-300;
const EPSILON = 2 ** -53;
const TWO_PI = 6.283185307179586;

/** P(shape, x): distribution function of a gamma with scale 1. `shape` > 0. */
export function gammaLower(shape: number, x: number): number {
  if (x <= 0) return 0;
  if (x === Infinity) return 1;
  if (shape < LARGE_SHAPE) return gammainc(x, shape);
  return x < shape ? lowerSeries(shape, x) : 1 - upperFraction(shape, x);
}

/** Q(shape, x) = 1 - P(shape, x), accurate in the upper tail. */
export function gammaUpper(shape: number, x: number): number {
  if (x <= 0) return 1;
  if (x === Infinity) return 0;
  if (shape < LARGE_SHAPE) return gammainc(x, shape, true, true);
  return x < shape ? 1 - lowerSeries(shape, x) : upperFraction(shape, x);
}

/** x with P(shape, x) = p, or Q(shape, x) = p where `upper`. `p` in [0, 1]. */
export function gammaInverse(shape: number, p: number, upper = false): number {
  if (p === 0) return upper ? Infinity : 0;
  if (p === 1) return upper ? 0 : Infinity;
  if (shape < LARGE_SHAPE) return gammaincinv(p, shape, upper);
  return largeInverse(shape, p, upper);
}

/** x^shape e^-x / Gamma(shape + 1) for a large shape. */
export function gammaPrefactor(shape: number, x: number): number {
  const squared = shape * shape;
  const stirling = (1 / 12 - (1 / 360 - 1 / (1260 * squared)) / squared) / shape;
  return exp(shape * log1pmx((x - shape) / shape) - stirling) / Math.sqrt(TWO_PI * shape);
}

export function isLargeShape(shape: number): boolean {
  return shape >= LARGE_SHAPE;
}

function lowerSeries(shape: number, x: number): number {
  let term = 1;
  let sum = 1;
  for (let n = 1; term > sum * EPSILON; n++) {
    term *= x / (shape + n);
    sum += term;
  }
  return gammaPrefactor(shape, x) * sum;
}

function upperFraction(shape: number, x: number): number {
  let b = x + 1 - shape;
  let c = 1 / TINY;
  let d = 1 / b;
  let value = d;
  for (let n = 1; ; n++) {
    const a = n * (shape - n);
    b += 2;
    d = a * d + b;
    if (Math.abs(d) < TINY) d = TINY;
    c = b + a / c;
    if (Math.abs(c) < TINY) c = TINY;
    d = 1 / d;
    const factor = d * c;
    value *= factor;
    if (Math.abs(factor - 1) <= 2 * EPSILON) break;
  }
  return gammaPrefactor(shape, x) * shape * value;
}

/** Halley's method from Wilson and Hilferty's cube-root guess (1931), on the nearer tail. */
function largeInverse(shape: number, p: number, upper: boolean): number {
  const z = upper ? -normalQuantile(p, 0, 1) : normalQuantile(p, 0, 1);
  const root = 1 - 1 / (9 * shape) + z / (3 * Math.sqrt(shape));
  let x = shape * Math.max(root, 0.05) ** 3;
  const useUpper = z > 0;
  const target = useUpper === upper ? p : 1 - p;
  for (let step = 0; step < 20; step++) {
    const tail = useUpper ? gammaUpper(shape, x) - target : target - gammaLower(shape, x);
    const density = (gammaPrefactor(shape, x) * shape) / x;
    const newton = tail / density;
    const move = newton / (1 + 0.5 * newton * ((shape - 1) / x - 1));
    x = Math.max(x + move, x / 2);
    if (Math.abs(move) <= 4 * EPSILON * x) break;
  }
  return x;
}
