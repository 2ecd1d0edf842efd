/** The place where a rising function crosses 0. */

const STEPS = 200;

/**
 * x in [low, high] with f(x) = 0 for a continuous f that rises through 0, by bisection kept
 * quick with the secant (Illinois rule: Dowell and Jarratt 1971); undefined where f does not
 * change sign. To the last digits of x.
 */
export function rootOf(f: (x: number) => number, low: number, high: number): number | undefined {
  let [a, b, fa, fb] = [low, high, f(low), f(high)];
  if (!(fa <= 0 && fb >= 0)) return undefined;
  for (let step = 0; step < STEPS && b - a > 4e-16 * Math.abs(a + b); step++) {
    const secant = (a * fb - b * fa) / (fb - fa);
    const x = step % 3 !== 2 && secant > a && secant < b ? secant : a + (b - a) / 2;
    const fx = f(x);
    if (fx === 0) return x;
    if (fx < 0) {
      [a, fa, fb] = [x, fx, fb / 2];
    } else {
      [b, fb, fa] = [x, fx, fa / 2];
    }
  }
  return a + (b - a) / 2;
}
