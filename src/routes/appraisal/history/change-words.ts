/** A change in the reader's language: what it is about, and a value before or after. */
import type { TFunction } from 'i18next';
import type { Change } from '../../../../shared/model/compare/compare.ts';
import type { Distribution, ModelDocument } from '../../../../shared/model/document.ts';
import type { Json } from '../../../../shared/model/edit/edit.ts';
import { distributionWords } from '../../../i18n/distribution-words.ts';
import { formatValue } from '../../../i18n/format.ts';
import type { Language } from '../../../store/settings.ts';

interface Reader {
  readonly document: ModelDocument;
  readonly t: TFunction;
  readonly language: Language;
}

/** Such as "Cost of a visit: value". */
export function placeWords({ place, label }: Change, { document, t }: Reader): string {
  const last = place.findLastIndex((step) => typeof step !== 'string');
  const names = fieldNames(place, last);
  const own = new Map(
    [...document.covariates, ...document.strategies].map(({ id, label: name }) => [id, name]),
  );
  const field = names.map((name) => own.get(name) ?? fieldWord(name, t)).join(', ');
  const list = last < 0 ? '' : fieldWord(String(place[last - 1] ?? ''), t);
  const whole = last === place.length - 1;
  if (whole) return label ? t('history.place', { label, field: list }) : list;
  return label ? t('history.place', { label, field }) : field;
}

/** Of the field within its item; the question's own parts go without saying. */
function fieldNames(place: Change['place'], last: number): string[] {
  const names = place.slice(last + 1).filter((step) => typeof step === 'string');
  return last < 0 && names.length > 1 ? names.slice(1) : names;
}

/** A field of the document by its name; one of a newer format as it stands there. */
function fieldWord(name: string, t: TFunction): string {
  const look = t as unknown as (keys: string[]) => string;
  const key = `history.fields.${name}`;
  const word = look([key]);
  return word === key ? name : word;
}

const LONGEST = 300;

export function changedValue(
  { field }: Change,
  value: Json | undefined,
  { document, t, language }: Reader,
): string {
  if (value === undefined || value === null || value === '') return t('history.nothing');
  if (typeof value === 'number') return formatValue(value, language);
  if (typeof value === 'boolean') return t(value ? 'frontier.yes' : 'frontier.no');
  if (typeof value === 'string')
    return shortened((REFERENCES.has(field) && labelOf(value, document)) || value);
  if (field === 'distribution') {
    return distributionWords(value as unknown as Distribution, document, t, language);
  }
  if (Array.isArray(value) && value.every((item) => typeof item === 'string')) {
    return shortened(value.map((id) => labelOf(id, document) ?? id).join(', '));
  }
  return shortened(JSON.stringify(value));
}

/** Fields that name a thing by its id. */
const REFERENCES = new Set([
  'comparator',
  'thresholdInForce',
  'remainder',
  'reference',
  'from',
  'to',
  'state',
  'last',
]);

function labelOf(id: string, { strategies, states, parameters, question }: ModelDocument) {
  const named = [...strategies, ...states, ...parameters, ...question.thresholds];
  return named.find((item) => item.id === id)?.label;
}

function shortened(text: string): string {
  return text.length <= LONGEST ? text : `${text.slice(0, LONGEST)}…`;
}
