import { readdirSync, readFileSync } from 'node:fs';
import { expect, test } from 'vitest';
import { ISSUE_WORDS } from '../../shared/cli/issue-words.ts';
import { wordsOf } from '../../shared/cli/words.ts';
import { error, warning } from '../../shared/model/issue.ts';

const SHARED = new URL('../../shared/', import.meta.url);

/** Codes of the brief's sentences, no issues: tests/app/i18n/brief-words.test.ts sees to them. */
const SENTENCES = 'export/brief/';

/** Every quoted `area.what` in the sources: codes are written out, whatever carries them. */
function codesInSources(): Map<string, string> {
  const codes = new Map<string, string>();
  for (const file of readdirSync(SHARED, { recursive: true, encoding: 'utf8' })) {
    if (!file.endsWith('.ts') || file === 'cli/issue-words.ts') continue;
    if (file.startsWith(SENTENCES)) continue;
    const source = readFileSync(new URL(file, SHARED), 'utf8');
    for (const [, code] of source.matchAll(/['"]([a-z][A-Za-z]*\.[a-z][A-Za-z]*)['"]/g)) {
      if (!code!.endsWith('.ts') && !code!.endsWith('.json')) codes.set(code!, file);
    }
  }
  return codes;
}

test('every issue code in shared has words', () => {
  const codes = codesInSources();
  expect(codes.size).toBeGreaterThan(100);
  expect([...codes].filter(([code]) => !Object.hasOwn(ISSUE_WORDS, code))).toEqual([]);
});

test('no words are left for a code that is gone', () => {
  const codes = codesInSources();
  expect(Object.keys(ISSUE_WORDS).filter((code) => !codes.has(code))).toEqual([]);
});

test('a line has severity, code, place and words', () => {
  const issue = error('document.invalidType', ['states', 0, 'id'], {
    expected: 'string',
    got: 'number',
  });
  expect(wordsOf(issue)).toBe(
    'error document.invalidType at states.0.id: expected string, got number',
  );
});

test('a place inside a formula counts its characters from 1', () => {
  const issue = warning('formula.empty', ['start'], {}, { start: 4, end: 6 });
  expect(wordsOf(issue)).toBe(
    'warning formula.empty at start, characters 5 to 6: the formula is empty',
  );
});

test('a stretch without its params is left out', () => {
  const path = ['f'];
  expect(wordsOf(error('formula.unknownName', path, { name: 'p_dye' }))).toBe(
    'error formula.unknownName at f: nothing is called p_dye',
  );
  expect(
    wordsOf(error('formula.unknownName', path, { name: 'p_dye', suggestion: 'p_die' })),
  ).toContain('nothing is called p_dye; did you mean p_die?');
});

test('a code without words stands alone', () => {
  expect(wordsOf(error('later.thing', [], { n: 1 }))).toBe('error later.thing: {"n":1}');
  expect(wordsOf(error('toString'))).toBe('error toString: {}');
});

test('a document cannot write escape codes or a thousand lines to the terminal', () => {
  const hostile = wordsOf(
    error('document.invalidKey', [`a\u001b[2J\n`], { key: `\u202e${'x'.repeat(1_000)}` }),
  );
  expect(hostile).not.toMatch(/[\p{Cc}\p{Bidi_Control}]/u);
  expect(hostile.length).toBeLessThan(400);
});
