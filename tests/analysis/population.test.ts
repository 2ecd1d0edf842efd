import { describe, expect, it } from 'vitest';
import { affectedPopulation, forPopulation } from '../../shared/analysis/population.ts';
import { expectClose } from './close.ts';
import { golden } from './golden.ts';

interface Case {
  inputs: { incidence: number; years: number; r: number };
  population: Record<'start_of_year' | 'end_of_year' | 'mid_year' | 'continuous', number>;
  evpi_per_person: number;
  population_evpi: Case['population'];
}
const cases = (golden('voi.json') as { population: Case[] }).population;
const TIMINGS = [
  ['startOfYear', 'start_of_year'],
  ['endOfYear', 'end_of_year'],
  ['midYear', 'mid_year'],
  ['continuous', 'continuous'],
] as const;

// Source: tests/golden/voi.json `population` (base R 4.2.2, closed form), to 1e-10.
describe.each(cases)('golden population $inputs', ({ inputs, ...want }) => {
  const people = { ...inputs, prevalent: 0, discountRate: inputs.r };
  it.each(TIMINGS)('%s', (timing, key) => {
    const population = affectedPopulation(people, timing);
    expectClose(population, want.population[key], 1e-10);
    const { value } = forPopulation(
      { value: want.evpi_per_person, standardError: null },
      population,
    );
    expectClose(value, want.population_evpi[key], 1e-10);
  });
});

describe('affectedPopulation', () => {
  const people = { incidence: 100, prevalent: 40, years: 3, discountRate: 0 };

  it('is a plain count without discounting, with those prevalent', () => {
    for (const [timing] of TIMINGS) expect(affectedPopulation(people, timing)).toBe(340);
  });

  it('counts a last year that is not whole in proportion', () => {
    const part = { ...people, prevalent: 0, years: 1.5, discountRate: 0.1 };
    expectClose(affectedPopulation(part, 'startOfYear'), 100 + 50 / 1.1, 1e-12);
    expectClose(affectedPopulation(part, 'endOfYear'), 100 / 1.1 + 50 / 1.1 ** 1.5, 1e-12);
    expectClose(affectedPopulation(part, 'midYear'), 100 / 1.1 ** 0.5 + 50 / 1.1 ** 1.25, 1e-12);
  });

  it('sums a sum of years term by term alike, also for rates close to 0 or below it', () => {
    for (const discountRate of [1e-9, 0.03, -0.02]) {
      let want = 0;
      for (let year = 0; year < 200; year++) want += 100 / (1 + discountRate) ** year;
      const got = affectedPopulation(
        { ...people, prevalent: 0, years: 200, discountRate },
        'startOfYear',
      );
      expectClose(got, want, 1e-12);
    }
  });
});

describe('forPopulation', () => {
  it('scales the standard error with the value', () => {
    expect(forPopulation({ value: 2, standardError: 0.5 }, 10)).toEqual({
      value: 20,
      standardError: 5,
    });
  });
});
