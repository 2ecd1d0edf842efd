import { expect, test } from 'vitest';
import { said } from './codes.ts';

test('an id is given once in its list', () => {
  expect(
    said(({ parameters, payoffs, question }) => {
      parameters.push({ ...parameters[0]!, symbol: 'again' });
      payoffs.push(payoffs[1]!);
      question.thresholds.push(question.thresholds[0]!);
    }),
  ).toEqual([
    'ids.duplicate question.thresholds.1.id',
    'ids.duplicate parameters.4.id',
    'ids.duplicate payoffs.2.id',
  ]);
});

test('inside rows and payoffs too', () => {
  const issues = said(({ movements, payoffs }) => {
    if (movements.type === 'rows') movements.rows[0]!.cells.push(movements.rows[0]!.cells[0]!);
    const [drug] = payoffs;
    if (drug?.type === 'state') drug.amounts.push({ ...drug.amounts[0]!, state: 'dead' });
  });
  expect(issues).toContain('ids.duplicate movements.rows.0.cells.1.id');
  expect(issues).toContain('ids.duplicate payoffs.0.amounts.1.id');
});

test('curves too', () => {
  const curve = { id: 'c', state: 'alive', formula: '1' };
  expect(
    said((document) => {
      document.movements = { type: 'survival', curves: [curve, curve], last: 'dead' };
    }),
  ).toContain('ids.duplicate movements.curves.1.id');
});

test('lists do not share their ids: a state may be called what a strategy is called', () => {
  expect(
    said((document) => {
      document.profiles[0]!.id = 'usual';
    }),
  ).toEqual([]);
});
