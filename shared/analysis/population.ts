/**
 * The population that a decision affects: those who face it today and those who will,
 * discounted to today, while the decision holds.
 * Source: Briggs, Claxton and Sculpher 2006; Rothery et al. 2020, Value in Health
 * 23:277-286 (from memory).
 */
import type { Question } from '../model/document.ts';

export type Beneficiaries = Pick<
  NonNullable<Question['beneficiaries']>,
  'incidence' | 'prevalent' | 'years' | 'discountRate'
>;

/** When in its year those of a year are counted; `continuous` spreads them over it. */
export type Timing = 'startOfYear' | 'endOfYear' | 'midYear' | 'continuous';

/**
 * Persons, discounted. Those prevalent count in full. A last year that is not whole
 * counts in proportion, at its own start, middle or end. Whole years (and parts, counted
 * at the start) give the same bits on every device; the other cases take a power that
 * may differ in its last bit.
 * @param beneficiaries years above 0, discount rate above -1.
 */
export function affectedPopulation(
  { incidence, prevalent, years, discountRate }: Beneficiaries,
  timing: Timing,
): number {
  if (timing === 'continuous') return prevalent + incidence * integral(discountRate, years);
  const factor = 1 / (1 + discountRate);
  const whole = Math.floor(years);
  const rest = years - whole;
  const { power, sum } = powers(factor, whole);
  const wholeYears =
    sum * { startOfYear: 1, midYear: Math.sqrt(factor), endOfYear: factor }[timing];
  const into = rest * { startOfYear: 0, midYear: 0.5, endOfYear: 1 }[timing];
  return prevalent + incidence * (wholeYears + rest * power * factor ** into);
}

/** A value per person and its standard error, for all of the population. */
export function forPopulation(
  perPerson: { readonly value: number; readonly standardError: number | null },
  population: number,
): { value: number; standardError: number | null } {
  const { value, standardError } = perPerson;
  return {
    value: value * population,
    standardError: standardError === null ? null : standardError * population,
  };
}

/** Integral of (1 + rate)^-t over [0, years]. */
function integral(rate: number, years: number): number {
  const force = Math.log1p(rate);
  return force === 0 ? years : -Math.expm1(-force * years) / force;
}

/**
 * factor^count and the sum of factor^t for t = 0 .. count - 1, by doubling: years may be
 * many, and products alone give the same bits on every device.
 */
function powers(factor: number, count: number): { power: number; sum: number } {
  if (count === 0) return { power: 1, sum: 0 };
  const half = powers(factor, Math.floor(count / 2));
  const even = { power: half.power * half.power, sum: half.sum * (1 + half.power) };
  if (count % 2 === 0) return even;
  return { power: even.power * factor, sum: even.sum + even.power };
}
