/** Sentences of the brief in the language of the page: their codes worded, each value by its kind. */
import type { TFunction } from 'i18next';
import type { Frequency } from '../../shared/export/brief/frequency.ts';
import type { BriefValue, Sentence } from '../../shared/export/brief/sentence.ts';
import type { Language } from '../store/settings.ts';
import {
  formatLargeMoney,
  formatMoney,
  formatNumber,
  formatPercent,
  formatValue,
} from './format.ts';
import type { OutcomeWords } from './outcome-words.ts';

export interface BriefReader {
  readonly t: TFunction;
  readonly language: Language;
  /** Of the document's currency. */
  readonly symbol: string;
  readonly outcome: OutcomeWords;
}

/** Values that are left out where they are 0, in the order they are told in. */
const DETAILS = ['uncertain', 'weak', 'notGraded', 'invented'];

export function sentenceWords({ code, params }: Sentence, reader: BriefReader): string {
  const words = Object.entries(params).map(([name, value]) => [
    name,
    // The number that a plural goes by is a number.
    name === 'count' ? value.value : valueWords(value, reader),
  ]);
  const values: Record<string, unknown> = Object.fromEntries(words);
  if (code === 'rests.inputs') values.details = detailWords(params, reader);
  if (code === 'change.profiles') values.profiles = profileWords(params, reader);
  return look(`brief.sentences.${code}`, reader, values);
}

/** "71 of 100", in the language of the page. */
export function frequencyWords({ count, of, bound }: Frequency, reader: BriefReader): string {
  return look(`brief.value.${bound}`, reader, { count, of });
}

export function thresholdWords(value: number, { t, language, symbol, outcome }: BriefReader) {
  return t('threshold', { amount: formatMoney(value, symbol, language), unit: outcome.per });
}

function valueWords(given: BriefValue, reader: BriefReader): string {
  const { t, language, symbol } = reader;
  switch (given.as) {
    case 'text':
      return given.value;
    case 'list':
      return listWords(given.value, reader);
    case 'code':
      return look(`brief.value.${given.value}`, reader, {});
    case 'money':
      return formatMoney(given.value, symbol, language);
    case 'largeMoney':
      return formatLargeMoney(given.value, symbol, language);
    case 'threshold':
      return thresholdWords(given.value, reader);
    case 'gain':
    case 'loss':
      return healthWords(given.value, given.as, reader);
    case 'count':
      return formatNumber(given.value, language);
    case 'years':
      return t('question.years', { count: given.value, value: formatValue(given.value, language) });
    case 'calendarYear':
      return String(given.value);
    case 'percent':
      return formatPercent(given.value, language);
    case 'frequency':
      return frequencyWords(given.value, reader);
  }
}

/** Health of a thousand people: three figures, as it is no surer than that. */
function healthWords(amount: number, as: 'gain' | 'loss', reader: BriefReader): string {
  const decimals = amount >= 100 || Number.isInteger(amount) ? 0 : amount >= 10 ? 1 : 2;
  return look('brief.value.health', reader, {
    amount: formatNumber(amount, reader.language, { decimals }),
    unit: as === 'gain' ? reader.outcome.gained : reader.outcome.lost,
  });
}

/** "a, b and c". */
function listWords(items: readonly string[], { t }: BriefReader): string {
  const last = items.at(-1) ?? '';
  if (items.length < 2) return last;
  return `${items.slice(0, -1).join(', ')}${t('brief.value.and')}${last}`;
}

function detailWords(params: Sentence['params'], reader: BriefReader): string {
  const told = DETAILS.flatMap((name) => {
    const count = params[name]?.value;
    return count === 0 ? [] : [look(`brief.sentences.rests.${name}`, reader, { count })];
  });
  const none = look('brief.sentences.rests.uncertain', reader, { count: 0 });
  return told.length > 0 ? listWords(told, reader) : none;
}

/** The groups that are named, and how many more there are. */
function profileWords({ profiles, more }: Sentence['params'], reader: BriefReader): string {
  const named = profiles?.as === 'list' ? profiles.value : [];
  const count = more?.value;
  if (!count) return listWords(named, reader);
  return listWords([...named, look('brief.value.more', reader, { count })], reader);
}

/** Codes are data that a later version may add to: they are looked up, not typed. */
function look(key: string, { t }: BriefReader, values: object): string {
  return (t as unknown as (key: string, values: object) => string)(key, values);
}
