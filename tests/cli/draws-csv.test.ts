import { describe, expect, it } from 'vitest';
import { drawsCsv } from '../../shared/cli/draws-csv.ts';
import { drawParameters } from '../../shared/engine/draw/draw.ts';
import { prepare } from '../../shared/engine/engine.ts';
import { tinyDocument } from '../fixtures/tiny-document.ts';

describe('drawsCsv', () => {
  it('writes uncertain parameters, costs and outcomes in full', () => {
    const tiny = tinyDocument();
    const settings = { samples: 3, seed: 1, plan: 'plain' } as const;
    const values = drawParameters(tiny.parameters, tiny.groups, settings, 0, 3);
    const draws = prepare(tiny).simulate(values, 0, 3);
    const [head, ...lines] = drawsCsv(tiny, values, draws).trimEnd().split('\n');
    expect(head).toBe(
      'draw,p_die,rr_die,c_year,cost_usual,cost_treatment,outcome_usual,outcome_treatment',
    );
    expect(lines).toHaveLength(3);
    const second = lines[1]!.split(',').map(Number);
    expect(second[0]).toBe(2);
    expect(second[1]).toBe(values.get('p_die')![1]);
    expect(second[5]).toBe(draws.cost[1]![1]);
    expect(second[7]).toBe(draws.outcome[1]![1]);
  });
});
