/**
 * The reader's own document, opened from a file: held in memory until the page is closed.
 * Keeping it on the device comes with the store of appraisals.
 */
import type { ReadResult } from '../../shared/model/read.ts';

/** The address of the opened file among the appraisals; no example bears this name. */
export const FILE_SLUG = 'file';

let opened: { readonly name: string; readonly text: string; readonly number: number } | null = null;
let count = 0;

/**
 * Reads a file; what can be read is what /appraisals/file then shows.
 * @returns the reader's verdict, with every issue found
 */
export async function openFile(file: File): Promise<ReadResult> {
  const [text, { readDocument }] = await Promise.all([
    file.text(),
    import('../../shared/model/read.ts'),
  ]);
  const result = readDocument(text);
  if (result.document) opened = { name: file.name, text, number: ++count };
  return result;
}

export function openedFile(): typeof opened {
  return opened;
}
