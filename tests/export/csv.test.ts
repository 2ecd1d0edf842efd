import { describe, expect, it } from 'vitest';
import { toCsv } from '../../shared/export/csv.ts';

describe('toCsv', () => {
  it('writes lines of fields', () => {
    const rows = [
      ['Strategy', 'Cost'],
      ['Care as now', 412.5],
    ];
    expect(toCsv(rows)).toBe('Strategy,Cost\r\nCare as now,412.5\r\n');
  });

  // RFC 4180, section 2: lines end in CR LF (1), fields parted by commas (4), quotes
  // around line breaks, double quotes and commas (6), a double quote doubled (7).
  it('quotes what would break a line', () => {
    expect(toCsv([['Register, reminders', 'a "new" one', 'two\nlines', 'b\r\nbb']])).toBe(
      '"Register, reminders","a ""new"" one","two\nlines","b\r\nbb"\r\n',
    );
  });

  it('writes numbers in full, and nothing for null', () => {
    expect(toCsv([[0.1, -1e-7, 12, null, 1 / 3]])).toBe('0.1,-1e-7,12,,0.3333333333333333\r\n');
  });

  it('writes decimal commas between semicolons', () => {
    const style = { decimal: 'comma' } as const;
    expect(toCsv([[0.5, 'a;b', 'c,d', -1.5e-7]], style)).toBe('0,5;"a;b";c,d;-1,5e-7\r\n');
  });

  it('lets no label pass for a formula', () => {
    expect(toCsv([['=1+1', '-a', '@b', '+c', 'x=1', -5]])).toBe("'=1+1,'-a,'@b,'+c,x=1,-5\r\n");
  });
});
