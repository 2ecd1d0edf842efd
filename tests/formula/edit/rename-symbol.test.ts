import { describe, expect, test } from 'vitest';
import { prepare } from '../../../shared/engine/engine.ts';
import { renameSymbol } from '../../../shared/formula/edit/rename-symbol.ts';
import type { Named } from '../../../shared/formula/edit/symbols.ts';
import type { ModelDocument } from '../../../shared/model/document.ts';
import { DocumentError } from '../../../shared/model/issue.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';
import { applied, DOCUMENTS, soundAfter } from '../../model/edit/after.ts';

const WHAT = ['parameter', 'variable', 'table', 'covariate'] as const;

function everyNamed(document: ModelDocument): Named[] {
  const { parameters, variables, tables, covariates } = document;
  const lists = [parameters, variables, tables, covariates];
  return WHAT.flatMap((what, index) => lists[index]!.map(({ id }) => ({ what, id })));
}

test.each(DOCUMENTS)('%s: all renamed at once, the answer is the same', (_, document) => {
  let renamed = document;
  for (const [index, named] of everyNamed(document).entries()) {
    // The clock of ages knows its covariate by name.
    if (named.what === 'covariate') continue;
    renamed = applied(renamed, renameSymbol(renamed, named, `renamed_${index}`));
  }
  expect(renamed).not.toBe(document);
  soundAfter(renamed, []);
  expect(prepare(renamed).base().strategies).toEqual(prepare(document).base().strategies);
});

describe('in the tiny document', () => {
  const scenarios: ModelDocument['scenarios'] = [
    {
      id: 's',
      label: 'S',
      overrides: [
        { type: 'setting', setting: 'horizon', value: 5 },
        { type: 'variable', variable: 'v_die', formula: 'p_die * rr_die ^ 2' },
        { type: 'parameter', parameter: 'rr_die', value: 0.9 },
      ],
    },
  ];
  const tiny = tinyDocument({ scenarios });
  const rr: Named = { what: 'parameter', id: 'rr_die' };

  test('formulas by strategy and those of scenarios follow', () => {
    const document = soundAfter(tiny, renameSymbol(tiny, rr, 'effect'));
    expect(document.parameters[1]?.symbol).toBe('effect');
    expect(document.variables[0]?.formula).toMatchObject({
      byStrategy: { treatment: 'p_die * effect' },
    });
    expect(document.scenarios[0]?.overrides).toEqual([
      scenarios[0]!.overrides[0],
      { type: 'variable', variable: 'v_die', formula: 'p_die * effect ^ 2' },
      scenarios[0]!.overrides[2],
    ]);
  });

  test('a formula that does not parse follows too', () => {
    const variables = tiny.variables.map((each) => ({ ...each, formula: 'p_die * (rr_die + ' }));
    const broken = tinyDocument({ variables });
    const document = applied(broken, renameSymbol(broken, rr, 'effect'));
    expect(document.variables[0]?.formula).toBe('p_die * (effect + ');
  });

  test('of two with one symbol, formulas mean the first', () => {
    const variables = [...tiny.variables, { ...tiny.variables[0]!, id: 'twin', symbol: 'rr_die' }];
    const twice = tinyDocument({ variables });
    const edits = renameSymbol(twice, { what: 'variable', id: 'twin' }, 'other');
    expect(edits).toHaveLength(1);
    expect(applied(twice, edits).variables[0]?.formula).toEqual(tiny.variables[0]?.formula);
  });

  test('to its own symbol, or of nothing, is no edit', () => {
    expect(renameSymbol(tiny, rr, 'rr_die')).toEqual([]);
    expect(renameSymbol(tiny, { what: 'table', id: 'rr_die' }, 'x')).toEqual([]);
  });

  test('to a symbol that is taken or kept is refused', () => {
    expect(() => renameSymbol(tiny, rr, 'p_die')).toThrow(DocumentError);
    expect(() => renameSymbol(tiny, rr, 'max')).toThrow('names.reserved');
  });
});
