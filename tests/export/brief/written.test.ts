import { expect, it } from 'vitest';
import type { Sentence } from '../../../shared/export/brief/sentence.ts';
import {
  modelDigest,
  sentenceKeys,
  withSentence,
  writtenSentences,
} from '../../../shared/export/brief/written.ts';
import { digestOf } from '../../../shared/model/digest.ts';
import { readDocument } from '../../../shared/model/read.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';

const document = tinyDocument();
const writtenFor = modelDigest(document);
const written = { text: 'Yes, if nurses can be found.', writtenFor };
const one = { ...document, brief: withSentence(document, 'en', 'answer.worthAbove', written) };

it('keeps a sentence by language and code, through a file', () => {
  const read = readDocument(JSON.stringify(one)).document;
  expect(read && [...writtenSentences(read, 'en')]).toEqual([['answer.worthAbove', written]]);
  expect(read && writtenSentences(read, 'fr').size).toBe(0);
});

it('leaves the model its identity, and the document not', () => {
  expect(modelDigest(one)).toBe(writtenFor);
  expect(writtenFor).toBe(digestOf(document));
  expect(digestOf(one)).not.toBe(digestOf(document));
});

it('takes a sentence away and keeps the others', () => {
  const two = { ...one, brief: withSentence(one, 'en', 'caution', written) };
  const left = { ...two, brief: withSentence(two, 'en', 'answer.worthAbove', null) };
  expect([...writtenSentences(left, 'en').keys()]).toEqual(['caution']);
});

it.each(['__proto__', 'constructor'])('a document with the key %s is refused', (key) => {
  const sentences = `{"en": {"${key}": ${JSON.stringify(written)}}}`;
  const text = `${JSON.stringify(document).slice(0, -1)}, "brief": {"sentences": ${sentences}}}`;
  expect(readDocument(text).document).toBeNull();
});

it('numbers a code that comes again', () => {
  const sentence = (code: string): Sentence => ({ code, params: {} });
  const codes = ['sure.best', 'change.profiles', 'change.profiles', 'caution'];
  expect(sentenceKeys(codes.map(sentence))).toEqual([
    'sure.best',
    'change.profiles',
    'change.profiles.2',
    'caution',
  ]);
});
