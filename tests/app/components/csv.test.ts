// RFC 4180: lines end in CRLF; fields with commas, quotes or line breaks are quoted, and a
// quote is doubled.
import { expect, it } from 'vitest';
import { toCsv } from '../../../src/components/csv.ts';

it('writes lines of fields', () => {
  expect(
    toCsv([
      ['Strategy', 'Cost'],
      ['Care as now', 412.5],
    ]),
  ).toBe('Strategy,Cost\r\nCare as now,412.5\r\n');
});

it('quotes what would break a line', () => {
  expect(toCsv([['Register, reminders', 'a "new" one', 'two\nlines']])).toBe(
    '"Register, reminders","a ""new"" one","two\nlines"\r\n',
  );
});

it('lets no label pass for a formula, and leaves numbers alone', () => {
  expect(toCsv([['=1+1', '@x', -5]])).toBe("'=1+1,'@x,-5\r\n");
});
