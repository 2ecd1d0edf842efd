import { describe, expect, it } from 'vitest';
import { Graph, VARIES } from '../../shared/engine/graph.ts';

describe('Graph', () => {
  it('makes equal nodes once', () => {
    const graph = new Graph();
    const a = graph.parameter(0, true);
    const b = graph.parameter(1, true);
    expect(graph.binary('add', a, b)).toBe(graph.binary('add', a, b));
    expect(graph.binary('add', a, b)).not.toBe(graph.binary('add', b, a));
    expect(graph.unary('exp', a)).toBe(graph.unary('exp', a));
  });

  it('folds constants', () => {
    const graph = new Graph();
    const two = graph.constant(2);
    expect(graph.valueOf(graph.binary('power', two, graph.constant(3)))).toBe(8);
    expect(graph.valueOf(graph.unary('negate', two))).toBe(-2);
    expect(graph.valueOf(graph.apply('half', (x) => x / 2, [two]))).toBe(1);
  });

  it('leaves out what changes nothing', () => {
    const graph = new Graph();
    const a = graph.parameter(0, true);
    const zero = graph.constant(0);
    const one = graph.constant(1);
    expect(graph.binary('add', a, zero)).toBe(a);
    expect(graph.binary('add', zero, a)).toBe(a);
    expect(graph.binary('multiply', one, a)).toBe(a);
    expect(graph.binary('divide', a, one)).toBe(a);
    expect(graph.valueOf(graph.binary('multiply', a, zero))).toBe(0);
    expect(graph.select(one, a, zero)).toBe(a);
    expect(graph.select(a, one, one)).toBe(one);
  });

  it('knows what a value varies with', () => {
    const graph = new Graph();
    const fixed = graph.parameter(0, false);
    const uncertain = graph.parameter(1, true);
    const age = graph.binary('add', graph.covariate(0), graph.clock('cycle'));
    expect(graph.node(age)).toMatchObject({ wide: false, varies: VARIES.profile | VARIES.cycle });
    expect(graph.node(graph.unary('exp', fixed))).toMatchObject({ wide: false, varies: 0 });
    const both = graph.binary('multiply', age, uncertain);
    expect(graph.node(both)).toMatchObject({ wide: true, varies: 3 });
  });

  it('spreads a number that meets a column', () => {
    const graph = new Graph();
    const sum = graph.binary('add', graph.parameter(0, true), graph.constant(5));
    for (const arg of graph.node(sum).args) expect(graph.node(arg).wide).toBe(true);
  });

  it('tells negative zero from zero', () => {
    const graph = new Graph();
    expect(graph.constant(-0)).not.toBe(graph.constant(0));
  });

  it('lets entries of one exponential share its work', () => {
    const graph = new Graph();
    const rate = graph.parameter(0, true);
    const places = [[0, 1]] as const;
    const first = graph.exponential(2, places, [rate], 1);
    expect(graph.exponential(2, places, [rate], 1)).toEqual(first);
    expect(graph.node(first[0]!).args).toEqual(graph.node(first[1]!).args);
    expect(graph.exponential(2, places, [rate], 0.5)).not.toEqual(first);
  });
});
