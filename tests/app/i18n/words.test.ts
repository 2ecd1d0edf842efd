/** Every word in both languages, and none anywhere else. */
import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { parseSync } from 'vite';
import { describe, expect, it } from 'vitest';
import { en } from '../../../src/i18n/en.ts';
import { fr } from '../../../src/i18n/fr.ts';

type Tree = { readonly [key: string]: string | Tree };

function leaves(tree: Tree, path = ''): Map<string, string> {
  const found = Object.entries(tree).flatMap(([key, value]) =>
    typeof value === 'string'
      ? [[`${path}${key}`, value] as const]
      : [...leaves(value, `${path}${key}.`)],
  );
  return new Map(found);
}

const english = leaves(en);
const french = leaves(fr as Tree);

/** Terms that are the same in both languages, and what holds no words at all. */
const SAME = new Set([
  'steps.question',
  'question.population',
  'question.perspective',
  'question.citation',
  'evidence.source',
  'outcome.qaly.singular',
  'outcome.daly.singular',
  'strip.noNumber',
  'frontier.csv',
  'finder.kinds.variable',
  'finder.kinds.action',
  'charts.png',
  'charts.svg',
  'more.trace.cycle',
  'more.breakdown.total',
  'uncertainty.plane.part',
  'distributions.gamma',
  'distributions.pert',
  'distributions.weibull',
  'distributions.gompertz',
]);

const gaps = (text: string) => [...text.matchAll(/\{\{(\w+)\}\}/g)].map((gap) => gap[1]).sort();

describe('French', () => {
  it('has the keys of English and no other', () => {
    expect([...french.keys()].sort()).toEqual([...english.keys()].sort());
  });

  it('is not left in English', () => {
    const same = [...english].filter(([key, text]) => french.get(key) === text && !SAME.has(key));
    expect(same).toEqual([]);
  });

  it('leaves the same gaps for values', () => {
    for (const [key, text] of english) {
      expect([key, gaps(french.get(key) ?? '')]).toEqual([key, gaps(text)]);
    }
  });

  it('keeps its double punctuation on the line', () => {
    const loose = [...french].filter(([, text]) => /[ ][;:?!»]|«[ ]/.test(text));
    expect(loose).toEqual([]);
  });
});

function filesIn(folder: string, ending: RegExp): string[] {
  return readdirSync(folder, { withFileTypes: true, recursive: true })
    .filter((entry) => entry.isFile() && ending.test(entry.name))
    .map((entry) => join(entry.parentPath, entry.name));
}

/** The program's name is the same everywhere. */
const NAMES = new Set(['Steelyard']);
/** Attributes that are read out or shown. */
const SHOWN = new Set(['aria-label', 'aria-valuetext', 'title', 'alt', 'placeholder', 'label']);
const LETTERS = /\p{L}{2,}/u;

interface SyntaxNode {
  readonly type: string;
  readonly value?: unknown;
  readonly name?: { readonly name?: string };
}

/** Texts in the markup of a component that no dictionary holds. */
function hardCoded(source: string): string[] {
  const found: string[] = [];
  const visit = (node: unknown): void => {
    if (Array.isArray(node)) node.forEach(visit);
    if (typeof node !== 'object' || node === null || Array.isArray(node)) return;
    const text = shownText(node as SyntaxNode);
    if (text !== null && LETTERS.test(text) && !NAMES.has(text)) found.push(text);
    Object.values(node).forEach(visit);
  };
  visit(parseSync('component.tsx', source).program.body);
  return found;
}

function shownText({ type, value, name }: SyntaxNode): string | null {
  if (type === 'JSXText') return String(value).trim();
  if (type !== 'JSXAttribute' || !SHOWN.has(name?.name ?? '')) return null;
  const literal = value as SyntaxNode | null;
  return literal?.type === 'Literal' ? String(literal.value) : null;
}

describe('components', () => {
  it.each(filesIn('src', /\.tsx$/))('%s writes no words of its own', (file) => {
    expect(hardCoded(readFileSync(file, 'utf8'))).toEqual([]);
  });

  it('would be found out if they did', () => {
    expect(hardCoded('const a = <b title="Good day">Hello {name}</b>;')).toEqual([
      'Good day',
      'Hello',
    ]);
  });
});

describe('issues', () => {
  /** Codes that a document can bring about, as they stand in the sources of shared/. */
  const codes = ['model', 'formula', 'engine', 'analysis'].flatMap((folder) =>
    filesIn(join('shared', folder), /\.ts$/).flatMap((file) => codesIn(readFileSync(file, 'utf8'))),
  );

  it.each([...new Set(codes)].sort())('%s has words', (code) => {
    expect(english.has(`issues.${code}`)).toBe(true);
  });

  it('were found', () => {
    expect(codes.length).toBeGreaterThan(100);
  });
});

function codesIn(source: string): string[] {
  const areas =
    'analysis|distribution|document|formula|groups|ids|movements|names|parameters|payoffs|profiles|question|run|scenarios|start|states|strategies|tables|values|variables';
  const code = new RegExp(`'((?:${areas})\\.[a-z][a-zA-Z]+)'`, 'g');
  return [...source.matchAll(code)].flatMap((match) => match[1] ?? []);
}
