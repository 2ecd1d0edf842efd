/** Sentences of the brief that a person wrote in place of the drafted ones. */

import { digestOf } from '../../model/digest.ts';
import type { ModelDocument } from '../../model/document.ts';
import type { Sentence } from './sentence.ts';

export interface WrittenSentence {
  readonly text: string;
  /** `modelDigest` of the document that it was written for. */
  readonly writtenFor: string;
}

/**
 * Identity of what the sentences tell: the document but for what was written on the
 * brief, so that writing a sentence does not make the others out of date.
 */
export function modelDigest(document: ModelDocument): string {
  const { brief: _, ...model } = document;
  return digestOf(model);
}

/**
 * What a sentence is kept by: its code, with a number where a code comes more than once.
 * @param sentences of the whole page, in its order
 */
export function sentenceKeys(sentences: readonly Sentence[]): string[] {
  const seen = new Map<string, number>();
  return sentences.map(({ code }) => {
    const count = (seen.get(code) ?? 0) + 1;
    seen.set(code, count);
    return count === 1 ? code : `${code}.${count}`;
  });
}

/** By key; empty where nothing is written in that language. */
export function writtenSentences(
  { brief }: ModelDocument,
  language: string,
): ReadonlyMap<string, WrittenSentence> {
  const own = new Map(Object.entries(brief?.sentences ?? {})).get(language);
  return new Map(Object.entries(own ?? {}));
}

/** The document's `brief` with one sentence written, or with it taken away. */
export function withSentence(
  { brief }: ModelDocument,
  language: string,
  key: string,
  written: WrittenSentence | null,
): NonNullable<ModelDocument['brief']> {
  const { [key]: _, ...others } = brief?.sentences[language] ?? {};
  const own = written === null ? others : { ...others, [key]: { ...written } };
  return { ...brief, sentences: { ...brief?.sentences, [language]: own } };
}
