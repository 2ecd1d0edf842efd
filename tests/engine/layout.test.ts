import { describe, expect, it } from 'vitest';
import { Graph } from '../../shared/engine/graph.ts';
import { Layout } from '../../shared/engine/layout.ts';

function layout() {
  const graph = new Graph();
  const number = graph.constant(2);
  const column = graph.parameter(0, true);
  return { graph, number, column, own: new Layout(graph, 10, 4) };
}

describe('Layout', () => {
  it('gives a number one double and a column its width', () => {
    const { number, column, own } = layout();
    expect(own.place(number, false)).toEqual({ base: 0, stride: 0 });
    expect(own.place(column, false)).toEqual({ base: 1, stride: 0 });
    expect(own.size).toBe(11);
  });

  it('keeps a place for every cycle where asked', () => {
    const { column, own } = layout();
    expect(own.place(column, true)).toEqual({ base: 0, stride: 10 });
    expect(own.size).toBe(40);
  });

  it('puts the entries of an exponential side by side', () => {
    const { graph, column, own } = layout();
    const entries = graph.exponential(3, [[0, 1]], [column], 1);
    const row = graph.node(entries[0]!).args[0]!;
    own.place(row, false);
    expect(entries.map((entry) => own.place(entry, false).base)).toEqual([0, 10, 20]);
    expect(own.size).toBe(30);
  });

  it('gives scratch places again, and remembers the most in use', () => {
    const { number, column, own } = layout();
    own.place(number, false);
    own.beginScratch();
    own.place(column, false);
    own.endScratch();
    expect(own.size).toBe(1);
    expect(own.highest).toBe(11);
    expect(() => own.slot(column)).toThrow();
    expect(own.slot(number).base).toBe(0);
  });
});
