import { describe, expect, it } from 'vitest';
import type { Entry } from '../../../../src/features/finder/entry.ts';
import { folded, matching } from '../../../../src/features/finder/match.ts';

const entry = (kind: Entry['kind'], name: string, symbol?: string): Entry => ({
  id: name,
  kind,
  name,
  symbol,
  act: () => {},
});

const ENTRIES = [
  entry('step', 'Results'),
  entry('action', 'Print the brief'),
  entry('state', 'Après un infarctus'),
  entry('state', 'Cœur stable'),
  entry('parameter', 'Cost of a stroke', 'c_stroke'),
  entry('parameter', 'Stroke, yearly chance', 'p_stroke'),
  entry('parameter', 'Backstroke', 'back'),
];

const names = (text: string) => matching(ENTRIES, text, (kind) => kind).map(({ name }) => name);

describe('folded', () => {
  it('drops case, accents and ligatures', () => {
    expect(folded('ÉTAT Cœur ç')).toBe('etat coeur c');
  });
});

describe('matching', () => {
  it('shows steps and actions where nothing is written', () => {
    expect(names('  ')).toEqual(['Results', 'Print the brief']);
  });

  it('ignores accents, either way', () => {
    expect(names('apres')).toEqual(['Après un infarctus']);
    expect(names('COEUR')).toEqual(['Cœur stable']);
    expect(names('résults')).toEqual(['Results']);
  });

  it('puts the name that begins so first, then a word that does, then the rest', () => {
    expect(names('stroke')).toEqual(['Stroke, yearly chance', 'Cost of a stroke', 'Backstroke']);
  });

  it('takes words in any order, symbols, and the kind', () => {
    expect(names('stroke cost')).toEqual(['Cost of a stroke']);
    expect(names('p_stroke')).toEqual(['Stroke, yearly chance']);
    expect(names('state stable')).toEqual(['Cœur stable']);
    expect(names('nothing so called')).toEqual([]);
  });
});
