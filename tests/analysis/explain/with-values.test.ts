import { describe, expect, it } from 'vitest';
import { explainFormula } from '../../../shared/analysis/explain/formula.ts';
import { withValues } from '../../../shared/analysis/explain/with-values.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';

const place = { strategy: 'treatment', profile: 'all', cycle: 3 };

function filled(text: string, document = tinyDocument()): string {
  const explained = explainFormula(document, text, place);
  return withValues(text, explained, (value) => String(Number(value.toPrecision(4))));
}

describe('withValues', () => {
  it('puts values in place of names and leaves the rest as written', () => {
    expect(filled('1 -  die_now^(2 + cycle)')).toBe('1 -  0.08^(2 + 3)');
    expect(filled('p_die')).toBe('0.1');
    expect(filled('max(p_die, rr_die)')).toBe('max(0.1, 0.8)');
    expect(filled('12')).toBe('12');
  });

  it('puts what is below 0 in brackets', () => {
    const tiny = tinyDocument();
    const variables = [{ ...tiny.variables[0]!, formula: '-2' }];
    expect(filled('3 - die_now', tinyDocument({ variables }))).toBe('3 - (-2)');
    expect(filled('die_now', tinyDocument({ variables }))).toBe('-2');
  });

  it('leaves the names of tables', () => {
    const document = tinyDocument({
      tables: [
        {
          id: 't',
          symbol: 'life',
          label: 'Invented',
          keys: [{ label: 'Age', points: [0] }],
          values: [1],
          interpolation: 'step',
        },
      ],
    });
    expect(filled('lookup(life, age) * p_die', document)).toBe('lookup(life, 43) * 0.1');
  });
});
