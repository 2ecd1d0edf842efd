import { describe, expect, it } from 'vitest';
import { type Explained, explainFormula } from '../../../shared/analysis/explain/formula.ts';
import { type CompiledModel, compile } from '../../../shared/engine/compile.ts';
import { NodeValues } from '../../../shared/engine/evaluate.ts';
import { Graph } from '../../../shared/engine/graph.ts';
import { Lowering } from '../../../shared/engine/lower.ts';
import type { ModelDocument } from '../../../shared/model/document.ts';
import type { DocumentError } from '../../../shared/model/issue.ts';
import { formulaFor } from '../../../shared/model/strategy-formula.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';
import { CASES, off } from './examples.ts';

const place = { strategy: 'treatment', profile: 'all', cycle: 3 };

/** The value of a formula as the engine lowers it, at one place. */
function byEngine(model: CompiledModel, text: string, at: typeof place): number {
  const { document } = model;
  const graph = new Graph();
  const lowering = new Lowering(graph, document);
  const node = lowering.formula(text, { strategy: at.strategy, cycle: graph.clock('cycle') });
  const profile = document.profiles.findIndex(({ id }) => id === at.profile);
  const parameters = document.parameters.map(({ value }) => value);
  return new NodeValues({ ...model, graph }, profile, parameters).at(node, at.cycle);
}

describe('explainFormula', () => {
  it.each(CASES)('gives each variable of $name the value that the engine gives', (one) => {
    const { document } = one;
    const model = compile(document);
    const profile = document.profiles.at(-1)!.id;
    for (const { id } of document.strategies) {
      for (const variable of document.variables) {
        const text = formulaFor(variable.formula, id);
        if (text === undefined || text.includes('time_in_state')) continue;
        for (const cycle of [0, 1, 5]) {
          const at = { strategy: id, profile, cycle };
          const { value } = explainFormula(document, text, { ...at, tunnel: 0 });
          if (usesTimeInState(document, text)) continue;
          expect(off(value, byEngine(model, text, at)), variable.id).toBeLessThan(1e-12);
        }
      }
    }
  });

  it('gives the value of every part, and what each name is', () => {
    const document = tinyDocument();
    const told = explainFormula(document, '1 - die_now * (2 + cycle)', place);
    if (told.type !== 'call') throw new RangeError(told.type);
    const product = told.args[1] as Extract<Explained, { type: 'call' }>;
    expect([told.fn, product.fn, product.written]).toEqual([
      'subtract',
      'multiply',
      'die_now * (2 + cycle)',
    ]);
    expect(told.value).toBeCloseTo(1 - 0.08 * 5, 12);
    const [variable, sum] = product.args;
    expect(variable).toMatchObject({
      type: 'name',
      value: 0.1 * 0.8,
      meaning: {
        what: 'variable',
        site: {
          path: ['variables', 0, 'formula', 'byStrategy', 'treatment'],
          text: 'p_die * rr_die',
        },
      },
    });
    expect(sum).toMatchObject({ value: 5, args: [{ value: 2 }, { value: 3 }] });
  });

  it('takes clocks, covariates, and values other than the base case', () => {
    const document = tinyDocument();
    const values = (text: string, given?: ReadonlyMap<string, number>) =>
      explainFormula(document, text, { ...place, tunnel: 2 }, given).value;
    expect(values('age')).toBe(43);
    expect(values('start_age')).toBe(40);
    expect(values('time_in_state')).toBe(2);
    expect(values('time')).toBe(3);
    expect(values('cycle_length')).toBe(1);
    expect(values('die_now', new Map([['p_die', 0.2]]))).toBeCloseTo(0.16, 12);
  });

  it('says where a table was read', () => {
    const document = tinyDocument({
      tables: [
        {
          id: 't',
          symbol: 'life',
          label: 'Invented life table',
          keys: [{ label: 'Age', points: [0, 40, 50] }],
          values: [0.01, 0.02, 0.04],
          interpolation: 'linear',
        },
      ],
    });
    const told = explainFormula(document, 'lookup(life, age)', place);
    expect(told).toMatchObject({ type: 'lookup', table: { id: 't' }, args: [{ value: 43 }] });
    if (told.type !== 'lookup') throw new RangeError(told.type);
    expect(told.value).toBeCloseTo(0.026, 12);
    expect(told.keys).toEqual([{ label: 'Age', asked: 43, point: 40, next: 50, part: 0.3 }]);
    const [on] = (explainFormula(document, 'lookup(life, 50)', place) as typeof told).keys;
    expect(on).toEqual({ label: 'Age', asked: 50, point: 50, next: null, part: 0 });
  });

  it('refuses as data', () => {
    const document = tinyDocument();
    const codes = (text: string, broken = document) => {
      try {
        explainFormula(broken, text, place);
        return [];
      } catch (thrown) {
        return (thrown as DocumentError).issues.map(({ code }) => code);
      }
    };
    expect(codes('1 +')).toEqual(['formula.incomplete']);
    expect(codes('nobody')).toEqual(['formula.unknownName']);
    expect(codes('time_in_state')).toEqual(['formula.unknownName']);
    expect(codes('nothing(1)')).toEqual(['formula.unknownFunction']);
    expect(codes('lookup(p_die, 1)')).toEqual(['formula.lookupNeedsTable']);
    expect(codes('age', tinyDocument({ covariates: [] }))).toEqual(['formula.noStartAge']);
    const [variable] = document.variables;
    const circle = tinyDocument({ variables: [{ ...variable!, formula: 'die_now + 1' }] });
    expect(codes('die_now', circle)).toEqual(['formula.tooDeepTogether']);
    const lacking = tinyDocument({ variables: [{ ...variable!, formula: { byStrategy: {} } }] });
    expect(codes('die_now', lacking)).toEqual(['formula.missingForStrategy']);
  });
});

/** Whether a formula asks, through its variables, for a time in state. */
function usesTimeInState(document: ModelDocument, text: string): boolean {
  return document.variables.some(
    ({ symbol, formula }) =>
      new RegExp(`\\b${symbol}\\b`).test(text) && JSON.stringify(formula).includes('time_in_state'),
  );
}
