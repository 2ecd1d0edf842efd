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
 * counts in proportion, at its own start, middle or end.
 * @param beneficiaries years above 0, discount rate above -1.
 */
export function affectedPopulation(
  { incidence, prevalent, years, discountRate }: Beneficiaries,
  timing: Timing,
): number {
  const force = Math.log1p(discountRate);
  if (timing === 'continuous') return prevalent + incidence * integral(force, years);
  const whole = Math.floor(years);
  const rest = years - whole;
  const into = { startOfYear: 0, midYear: 0.5, endOfYear: 1 }[timing];
  const wholeYears = Math.exp(-force * into) * geometric(force, whole);
  const partYear = rest * Math.exp(-force * (whole + into * rest));
  return prevalent + incidence * (wholeYears + partYear);
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

/** Integral of exp(-force t) over [0, years]. */
function integral(force: number, years: number): number {
  return force === 0 ? years : -Math.expm1(-force * years) / force;
}

/** Sum of exp(-force t) for t = 0 .. count - 1, in closed form: years may be many. */
function geometric(force: number, count: number): number {
  return force === 0 ? count : Math.expm1(-force * count) / Math.expm1(-force);
}
