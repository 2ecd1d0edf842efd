import { describe, expect, it } from 'vitest';
import { checkModel } from '../../shared/engine/check.ts';
import { tinyDocument } from '../fixtures/tiny-document.ts';

const codes = (...args: Parameters<typeof tinyDocument>) =>
  checkModel(tinyDocument(...args)).map(({ code }) => code);

describe('checkModel', () => {
  it('finds nothing wrong with what is right', () => {
    expect(codes()).toEqual([]);
  });

  it('looks at references, formulas and distributions', () => {
    const [variable] = tinyDocument().variables;
    const [parameter] = tinyDocument().parameters;
    expect(codes({ variables: [{ ...variable!, formula: 'p_dye' }] })).toContain(
      'formula.unknownName',
    );
    const distribution = { type: 'uniform' as const, low: 0.3, high: 0.1 };
    const parameters = [{ ...parameter!, distribution }, ...tinyDocument().parameters.slice(1)];
    expect(codes({ parameters }).some((code) => code.startsWith('distribution.'))).toBe(true);
  });

  it('reads no formula of a document whose references do not hold', () => {
    const [variable] = tinyDocument().variables;
    const start = { remainder: 'nowhere', shares: [] };
    const found = codes({ start, variables: [{ ...variable!, formula: 'p_dye' }] });
    expect(found.length).toBeGreaterThan(0);
    expect(found).not.toContain('formula.unknownName');
  });
});
