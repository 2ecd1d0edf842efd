/**
 * Discount factors: (1 + r)^-t at t years, r a rate a year; with a list of rates by
 * year, the product of the years gone by and the part of the current one (the last
 * rate holds on).
 */
import type { DiscountRate } from '../model/document.ts';

/** Rounding guard: 12 monthly cycles are one whole year though 12 x (1/12) may fall short. */
const WHOLE_YEAR_GUARD = 1e-12;

/**
 * Factor at `time` years from the start.
 * @param wholeYears step at each anniversary instead of gliding
 */
export function discountFactor(rate: DiscountRate, time: number, wholeYears: boolean): number {
  const years = wholeYears ? Math.floor(time + WHOLE_YEAR_GUARD) : time;
  if (typeof rate === 'number') return (1 + rate) ** -years;
  const rates = rate.byYear;
  let factor = 1;
  let gone = 0;
  while (gone + 1 <= years && gone < rates.length - 1) {
    factor /= 1 + (rates[gone] as number);
    gone++;
  }
  const current = rates[Math.min(gone, rates.length - 1)] as number;
  return factor * (1 + current) ** -(years - gone);
}
