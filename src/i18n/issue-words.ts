/** An issue in the reader's language: what is wrong, and where. */
import type { TFunction } from 'i18next';
import type { ModelDocument } from '../../shared/model/document.ts';
import type { Issue, IssueParams, Path } from '../../shared/model/issue.ts';
import { KINDS, type Kind } from '../../shared/model/kinds.ts';
import type { Language } from '../store/settings.ts';
import { formatValue } from './format.ts';

interface Reader {
  readonly t: TFunction;
  readonly language: Language;
  /** The document that the issue is about, where one could be read. */
  readonly document: ModelDocument | null;
}

/** A code without words of its own still says its name. */
export function issueWords({ code, params }: Issue, reader: Reader): string {
  const { t } = reader;
  // Codes are data that newer engines may add to: they are looked up, not typed.
  const look = t as unknown as (keys: string[], values: object) => string;
  const words = look([`issues.${code}`, 'issues.unknown'], { ...worded(params, reader), code });
  const { suggestion } = params;
  return suggestion === undefined ? words : `${words} ${t('issueList.suggestion', { suggestion })}`;
}

/** Ids by their labels, kinds in words, numbers as the language writes them. */
function worded(params: IssueParams, { t, language, document }: Reader): IssueParams {
  const labels = new Map(
    [document?.strategies, document?.profiles, document?.states].flatMap((list) =>
      (list ?? []).map(({ id, label }) => [id, label] as const),
    ),
  );
  const word = (value: string | number) => {
    if (typeof value === 'number') return formatValue(value, language);
    const kind = KINDS.find((each): each is Kind => each === value);
    return labels.get(value) ?? (kind ? t(`kinds.${kind}`) : value);
  };
  return Object.fromEntries(Object.entries(params).map(([name, value]) => [name, word(value)]));
}

/**
 * Where it is, from the outside in, such as "parameters › Cost of a visit › value": items
 * of a list by their label where the document is known, by their number otherwise.
 */
export function issuePlace(path: Path, document: ModelDocument | null): string {
  return path
    .map((key, depth) => {
      const item = valueAt(document, path.slice(0, depth + 1));
      return typeof key === 'number' ? (nameOf(item) ?? `#${key + 1}`) : key;
    })
    .join(' › ');
}

/** The part of a formula that an issue points at, with a little of what stands around it. */
export interface Excerpt {
  readonly before: string;
  readonly part: string;
  readonly after: string;
}

const AROUND = 30;

export function issueExcerpt({ path, at }: Issue, document: ModelDocument | null): Excerpt | null {
  const text = valueAt(document, path);
  if (!at || typeof text !== 'string') return null;
  const from = Math.max(0, at.start - AROUND);
  const to = Math.min(text.length, at.end + AROUND);
  return {
    before: `${from > 0 ? '…' : ''}${text.slice(from, at.start)}`,
    part: text.slice(at.start, at.end),
    after: `${text.slice(at.end, to)}${to < text.length ? '…' : ''}`,
  };
}

function valueAt(document: unknown, path: Path): unknown {
  return path.reduce<unknown>(
    (here, key) => (here as Record<string | number, unknown> | null | undefined)?.[key],
    document,
  );
}

function nameOf(item: unknown): string | null {
  if (typeof item !== 'object' || item === null) return null;
  const { label, symbol, id } = item as Record<string, unknown>;
  const name = label ?? symbol ?? id;
  return typeof name === 'string' ? name : null;
}
