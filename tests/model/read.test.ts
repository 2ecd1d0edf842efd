import { describe, expect, test } from 'vitest';
import { digestOf } from '../../shared/model/digest.ts';
import type { ModelDocument } from '../../shared/model/document.ts';
import { checkDocument, readDocument } from '../../shared/model/read.ts';
import { tinyDocument } from '../fixtures/tiny-document.ts';

const tinyText = (change: object = {}) => JSON.stringify({ ...tinyDocument(), ...change });

test('a sound document is read, without a word', () => {
  const { document, issues } = readDocument(tinyText());
  expect(issues).toEqual([]);
  expect(document).toEqual(tinyDocument());
});

test('a byte order mark is passed over', () => {
  expect(readDocument(`\uFEFF${tinyText()}`).document?.id).toBe('tiny');
});

test('defaults are filled in', () => {
  const { scenarios: _, groups: __, analysis: ___, ...rest } = tinyDocument();
  const { document } = readDocument(JSON.stringify(rest));
  expect(document).toMatchObject({ scenarios: [], groups: [], analysis: { samples: 1000 } });
});

describe('fields of a newer version', () => {
  function decorated(): ModelDocument {
    const document = tinyDocument() as ModelDocument & Record<string, unknown>;
    document.addedLater = { deep: [1, { x: 'y' }] };
    (document.question as Record<string, unknown>).nested = ['new'];
    (document.parameters[0]!.distribution as Record<string, unknown>).truncatedAt = 0.5;
    return document;
  }

  test('survive a round trip at the top and inside, with the same digest', () => {
    const first = readDocument(JSON.stringify(decorated()));
    const second = readDocument(JSON.stringify(first.document));
    expect(first.document).toEqual(decorated());
    expect(second.document).toEqual(decorated());
    expect(digestOf(second.document)).toBe(digestOf(decorated()));
  });

  test('are part of the identity', () => {
    expect(digestOf(decorated())).not.toBe(digestOf(tinyDocument()));
  });
});

describe('refused', () => {
  test.each([
    ['truncated', tinyText().slice(0, 400), 'document.notJson', []],
    ['empty', '', 'document.notJson', []],
    ['a list', '[]', 'document.notObject', []],
    ['null', 'null', 'document.notObject', []],
    ['nesting', '['.repeat(65), 'document.tooDeep', []],
    ['other format', tinyText({ format: 'x' }), 'document.wrongFormat', ['format']],
    ['version 0', tinyText({ formatVersion: 0 }), 'document.badVersion', ['formatVersion']],
    ['version "1"', tinyText({ formatVersion: '1' }), 'document.badVersion', ['formatVersion']],
    ['newer', tinyText({ formatVersion: 2 }), 'document.newerFormat', ['formatVersion']],
    [
      'too many states',
      tinyText({ states: Array(501).fill(0) }),
      'document.tooManyItems',
      ['states'],
    ],
    ['a field missing', tinyText({ start: undefined }), 'document.missing', ['start']],
    [
      'a huge number',
      tinyText().replace('0.1,', '1e999,'),
      'document.numberNotFinite',
      ['parameters', 0, 'value'],
    ],
  ])('%s', (_, text, code, path) => {
    const { document, issues } = readDocument(text);
    expect(document).toBeNull();
    expect(issues).toMatchObject([{ code, path, severity: 'error' }]);
  });

  test('with the place where the text stops being JSON', () => {
    const { issues } = readDocument('{\n  "format": "steelyard/model",\n  "id": ,\n}');
    expect(issues).toEqual([
      { code: 'document.notJson', severity: 'error', path: [], params: { line: 3, column: 9 } },
    ]);
  });

  test('with the version that is known, when newer', () => {
    const { issues } = readDocument(tinyText({ formatVersion: 7 }));
    expect(issues[0]?.params).toEqual({ got: 7, known: 1 });
  });

  test('hostile keys, without touching any prototype', () => {
    const text = tinyText().replace('"id":"tiny"', '"id":"tiny","__proto__":{"polluted":1}');
    expect(readDocument(text).issues).toMatchObject([
      { code: 'document.hostileKey', path: ['__proto__'] },
    ]);
    expect(({} as Record<string, unknown>).polluted).toBeUndefined();
  });

  test('hostile names as ids', () => {
    expect(readDocument(tinyText({ id: 'constructor' })).issues).toMatchObject([
      { code: 'document.hostileName', path: ['id'] },
    ]);
  });

  test('10 MB count in UTF-8 bytes, not in characters', () => {
    const padding = (text: string, times: number) => tinyText({ padding: text.repeat(times) });
    expect(readDocument(padding('a', 4_000_000)).document).not.toBeNull();
    expect(readDocument(padding('€', 4_000_000)).issues).toMatchObject([
      { code: 'document.tooLarge', params: { maximum: 10_000_000 } },
    ]);
  });

  test('50 MB of opening brackets at once', () => {
    expect(readDocument('['.repeat(50_000_000)).issues).toMatchObject([
      { code: 'document.tooLarge' },
    ]);
  });

  test('a hundred issues are listed, the rest counted as more', () => {
    const { issues } = readDocument(tinyText({ parameters: Array(150).fill({ id: 1 }) }));
    expect(issues.length).toBe(101);
    expect(issues[100]).toMatchObject({ code: 'document.moreIssues', params: { shown: 100 } });
  });
});

describe('references', () => {
  const broken = () => ({ question: { ...tinyDocument().question, comparator: 'nobody' } });

  test('that do not hold refuse the document and keep it as a draft', () => {
    const result = readDocument(tinyText(broken()));
    expect(result).toMatchObject({
      document: null,
      draft: { id: 'tiny' },
      issues: [{ code: 'strategies.unknown', path: ['question', 'comparator'] }],
    });
  });

  test('warnings do not refuse', () => {
    const question = { ...tinyDocument().question, horizon: 10.2 };
    const { document, issues } = readDocument(tinyText({ question }));
    expect(document).not.toBeNull();
    expect(issues).toMatchObject([{ code: 'question.cyclesRounded', severity: 'warning' }]);
  });
});

describe('checkDocument', () => {
  test('takes a value that is already parsed, and leaves it alone', () => {
    const value = Object.freeze(tinyDocument());
    expect(checkDocument(value).document).toEqual(value);
  });

  test('guards depth and sharing', () => {
    const loop: Record<string, unknown> = { ...tinyDocument() };
    loop.self = loop;
    expect(checkDocument(loop).issues[0]).toMatchObject({ code: 'document.tooDeep' });
  });

  test('refuses what is no JSON value', () => {
    expect(checkDocument({ ...tinyDocument(), notes: new Map() }).issues).toMatchObject([
      { code: 'document.notPlain', path: ['notes'] },
    ]);
  });
});
