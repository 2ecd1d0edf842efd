/** The incremental tables of tests/golden, as the analyses take them. */
import { readFileSync } from 'node:fs';
import type { Option } from '../../shared/analysis/option.ts';

export interface GoldenTable {
  strategies: string[];
  cost: number[];
  effect: number[];
  order_by_cost: string[];
  status: ('frontier' | 'dominated' | 'extended dominated' | 'duplicate')[];
  dominated_by_example: (string | null)[];
  frontier: string[];
  frontier_icers_vs_previous: number[];
  icer_by_strategy: (number | null)[];
  icer_vs_first_named: (number | 'NaN' | null)[];
  nmb: {
    threshold: number;
    nmb: number[];
    nhb: number[] | null;
    best: string;
    tied_best: string[];
  }[];
}

export function golden(file: string): unknown {
  return JSON.parse(readFileSync(new URL(`../golden/${file}`, import.meta.url), 'utf8'));
}

/** cohort.json `incremental_tables`: base R 4.2.2, checked there by the upper envelope. */
const written = (
  golden('cohort.json') as { incremental_tables: { id: string; result: GoldenTable }[] }
).incremental_tables;

/** The tables of the three cohort models, by counting method: base R 4.2.2. */
const models = [
  ['cohort_model1.json', 'incremental'],
  ['cohort_model2.json', 'incremental_continuous'],
  ['cohort_model2.json', 'incremental_annualStep'],
  ['cohort_model3.json', 'incremental'],
].flatMap(([file, key]) => {
  const methods = (golden(file as string) as Record<string, Record<string, GoldenTable>>)[
    key as string
  ];
  return Object.entries(methods ?? {}).map(([method, table]) => ({
    id: `${file} ${key} ${method}`,
    table,
  }));
});

export const tables = [
  ...written.map(({ id, result }) => ({ id: `cohort.json ${id}`, table: result })),
  ...models,
];

export function optionsOf(table: GoldenTable): Option[] {
  return table.strategies.map((id, i) => ({
    id,
    cost: table.cost[i] as number,
    health: table.effect[i] as number,
  }));
}
