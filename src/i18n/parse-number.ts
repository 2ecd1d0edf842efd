/** Numbers as a reader types them, and as they stand in a field to be typed over. */
import type { Language } from '../store/settings.ts';

const PLAIN = /^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i;
const GROUPED = /^[+-]?\d{1,3}(,\d{3})+(\.\d*)?$/;

/**
 * French writes 1 234,5 and takes a point as well; English writes 1,234.5, and a comma
 * that groups nothing is no number there: "0,5" would be read wrongly either way.
 * @returns null where the text is no finite number
 */
export function parseNumber(text: string, language: Language): number | null {
  const bare = text
    .trim()
    .replaceAll('\u2212', '-')
    .replaceAll(/[\s\u00A0\u202F]/g, '');
  const plain = language === 'fr' ? bare.replace(',', '.') : ungrouped(bare);
  if (!PLAIN.test(plain)) return null;
  const value = Number(plain);
  return Number.isFinite(value) ? value : null;
}

function ungrouped(text: string): string {
  return GROUPED.test(text) ? text.replaceAll(',', '') : text;
}

/** Every digit of the value, ungrouped, with the decimal sign of the language. */
export function numberText(value: number, language: Language): string {
  const text = String(value);
  return language === 'fr' ? text.replace('.', ',') : text;
}

/** A share as the percentage that a reader would write: 0.035 is 3.5, to the last digit. */
export function toPercent(share: number): number {
  return Number((share * 100).toPrecision(15));
}

export function fromPercent(percent: number): number {
  return Number((percent / 100).toPrecision(15));
}
