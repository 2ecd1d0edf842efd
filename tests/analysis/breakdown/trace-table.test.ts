import { describe, expect, it } from 'vitest';
import { survivors, traceTable } from '../../../shared/analysis/breakdown/trace-table.ts';
import { prepare } from '../../../shared/engine/engine.ts';
import { exampleOf } from '../../examples/load.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';
import { CASES } from '../explain/examples.ts';
import { golden } from '../golden.ts';

describe('traceTable', () => {
  it.each(CASES)('has everybody somewhere at every boundary of $name', ({ document, base }) => {
    for (const { id } of base.strategies) {
      const rows = traceTable(document, base, id);
      expect(rows.length).toBe(base.cycles + 1);
      for (const { shares } of rows) {
        expect(shares.reduce((sum, share) => sum + share, 0)).toBeCloseTo(1, 12);
      }
    }
  });

  // tests/golden/cohort.json: base R 4.2.2, checked by matrix powers in Python.
  it('is the trace of the HIV example', () => {
    const document = exampleOf('hiv-combination-therapy');
    const base = prepare(document).base({ trace: true });
    const { published_example: published } = golden('cohort.json') as {
      published_example: { trace_mono: number[][] };
    };
    traceTable(document, base, document.strategies[0]!.id).forEach((row, cycle) => {
      const want = published.trace_mono[cycle]!;
      expect([row.cycle, row.time]).toEqual([cycle, cycle]);
      row.shares.forEach((share, state) => {
        expect(share).toBeCloseTo(want[state]!, 12);
      });
      expect(row.alive).toBeCloseTo(1 - want[3]!, 12);
    });
  });

  it('says who is left at the horizon (0.9^10 and 0.92^10, by hand)', () => {
    const document = tinyDocument();
    const base = prepare(document).base({ trace: true });
    const [usual, treatment] = survivors(document, base);
    expect(usual?.alive).toBeCloseTo(0.9 ** 10, 12);
    expect(treatment?.alive).toBeCloseTo(0.92 ** 10, 12);
    expect(treatment?.shares[1]).toBeCloseTo(1 - 0.92 ** 10, 12);
  });

  it('needs a trace', () => {
    const document = tinyDocument();
    const base = prepare(document).base();
    expect(() => traceTable(document, base, 'usual')).toThrow(RangeError);
    expect(() => survivors(document, base)).toThrow(RangeError);
  });
});
