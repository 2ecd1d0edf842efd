/** An issue in the reader's language; a code without words of its own still says its name. */
import type { TFunction } from 'i18next';
import type { ModelDocument } from '../../shared/model/document.ts';
import type { Issue, Path } from '../../shared/model/issue.ts';

export function issueWords({ code, params }: Issue, t: TFunction): string {
  // Codes are data that newer engines may add to: they are looked up, not typed.
  const look = t as unknown as (keys: string[], values: object) => string;
  return look([`issues.${code}`, 'issues.unknown'], { ...params, code });
}

/**
 * Where it is, from the outside in, such as "parameters › Cost of a visit › value": items
 * of a list by their label where the document is known, by their number otherwise.
 */
export function issuePlace(path: Path, document: ModelDocument | null): string {
  const words: string[] = [];
  let here: unknown = document;
  for (const key of path) {
    here = here === null || typeof here !== 'object' ? undefined : (here as never)[key];
    words.push(typeof key === 'number' ? (nameOf(here) ?? `#${key + 1}`) : key);
  }
  return words.join(' › ');
}

function nameOf(item: unknown): string | null {
  if (typeof item !== 'object' || item === null) return null;
  const { label, symbol, id } = item as Record<string, unknown>;
  const name = label ?? symbol ?? id;
  return typeof name === 'string' ? name : null;
}
