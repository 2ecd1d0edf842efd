import { describe, expect, it } from 'vitest';
import { compile } from '../../shared/engine/compile.ts';
import { NodeValues } from '../../shared/engine/evaluate.ts';
import { Graph } from '../../shared/engine/graph.ts';
import { tinyDocument } from '../fixtures/tiny-document.ts';

const model = compile(tinyDocument());
const valuesOf = (graph: Graph) => new NodeValues({ ...model, graph }, 0, [0.1, 0.8, 100, 0.8]);

describe('NodeValues', () => {
  it('reads leaves and clocks', () => {
    const graph = new Graph();
    const [parameter, age] = [graph.parameter(1, true), graph.covariate(0)];
    const [cycle, boundary] = [graph.clock('cycle'), graph.clock('boundary')];
    const values = valuesOf(graph);
    expect(values.at(parameter, 0)).toBe(0.8);
    expect(values.at(age, 0)).toBe(40);
    expect([0, 3, 1].map((at) => values.at(cycle, at))).toEqual([0, 3, 1]);
    expect(values.at(boundary, 3)).toBe(4);
  });

  it('applies operations by their meaning', () => {
    const graph = new Graph();
    const cycle = graph.clock('cycle');
    const two = graph.constant(2);
    const power = graph.binary('power', two, cycle);
    const chosen = graph.select(
      graph.binary('less', cycle, two),
      power,
      graph.unary('negate', two),
    );
    const applied = graph.apply('least', Math.min, [chosen, graph.parameter(2, true)]);
    const values = valuesOf(graph);
    expect([0, 1, 2].map((at) => values.at(applied, at))).toEqual([1, 2, -2]);
  });

  it('gives a row of an exponential (two states: 1 - exp(-r t))', () => {
    const graph = new Graph();
    const [stay, leave] = graph.exponential(2, [[0, 1]], [graph.parameter(0, false)], 2);
    const values = valuesOf(graph);
    expect(values.at(leave!, 0)).toBeCloseTo(1 - Math.exp(-0.2), 15);
    expect(values.at(stay!, 0)).toBeCloseTo(Math.exp(-0.2), 15);
  });
});
