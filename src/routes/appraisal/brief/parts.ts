/** The sentences of the page: in which part each stands, drafted or in a person's own words. */
import type { Brief } from '../../../../shared/export/brief/draft.ts';
import { sentenceKeys, type WrittenSentence } from '../../../../shared/export/brief/written.ts';
import { type BriefReader, sentenceWords } from '../../../i18n/brief-words.ts';

export type PartName = 'answer' | 'howSure' | 'whatWouldChange' | 'research' | 'restsOn';

const PARTS: readonly PartName[] = ['answer', 'howSure', 'whatWouldChange', 'research', 'restsOn'];

export interface PageSentence {
  /** What it is kept by. */
  readonly key: string;
  readonly drafted: string;
  /** Null where the draft stands. */
  readonly written: WrittenSentence | null;
}

export type PageParts = ReadonlyMap<PartName, readonly PageSentence[]>;

export function partsOf(
  brief: Brief,
  written: ReadonlyMap<string, WrittenSentence>,
  reader: BriefReader,
): PageParts {
  const keys = sentenceKeys(PARTS.flatMap((part) => brief[part]));
  let next = 0;
  return new Map(
    PARTS.map((part) => [
      part,
      brief[part].map((sentence) => {
        const key = keys[next++] as string;
        const drafted = sentenceWords(sentence, reader);
        return { key, drafted, written: written.get(key) ?? null };
      }),
    ]),
  );
}

/** What stands on the page. */
export function textOf({ drafted, written }: PageSentence): string {
  return written?.text ?? drafted;
}
