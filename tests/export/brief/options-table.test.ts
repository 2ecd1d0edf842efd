import { expect, it } from 'vitest';
import { briefCase } from '../../../shared/export/brief/case.ts';
import { optionsTable } from '../../../shared/export/brief/options-table.ts';
import { chances, given } from './given.ts';

it('lists options by cost with their ratios, or why there is none', () => {
  const { document, base } = given({ a: [100, 10], d: [400, 10.5], b: [300, 11] });
  const brief = briefCase(document, base, 250);
  const table = optionsTable(brief, chances({ a: 0.3, d: 0, b: 0.7 }));
  expect(table.map(({ id, icer, noIcer }) => [id, icer, noIcer])).toEqual([
    ['a', null, 'reference'],
    ['b', 200, null],
    ['d', null, 'dominated'],
  ]);
  expect(table.map(({ best }) => best?.count)).toEqual([30, 70, 0]);
  expect(table[1]).toMatchObject({ label: 'B', against: 'A', isBest: true, isComparator: false });
  expect(table[2]).toMatchObject({ because: ['B'], isBest: false });
  expect(optionsTable(brief, null)[0]?.best).toBeNull();
});
