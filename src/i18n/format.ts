/**
 * Numbers as the reader's language writes them. `symbol` is the document's currency
 * symbol, which no locale knows: each language says on which side it stands.
 */
import type { Language } from '../store/settings.ts';

const NO_BREAK = '\u00A0';

const formatters = new Map<string, Intl.NumberFormat>();

/** Formatters are dear to make, and every movement of the poise writes a hundred numbers. */
function formatter(language: Language, options: Intl.NumberFormatOptions): Intl.NumberFormat {
  const key = `${language} ${JSON.stringify(options)}`;
  let format = formatters.get(key);
  if (format === undefined) {
    format = new Intl.NumberFormat(language, options);
    formatters.set(key, format);
  }
  return format;
}

interface NumberOptions {
  /** Decimals, always all of them. */
  readonly decimals?: number;
  /** Write + before what is above 0. */
  readonly signed?: boolean;
}

export function formatNumber(
  value: number,
  language: Language,
  { decimals = 0, signed = false }: NumberOptions = {},
): string {
  const format = formatter(language, {
    minimumFractionDigits: decimals,
    maximumFractionDigits: decimals,
    signDisplay: signed ? 'exceptZero' : 'negative',
  });
  return withMinus(format.format(value));
}

/** Money to the whole unit; small amounts with the decimals that tell them apart. */
export function formatMoney(
  value: number,
  symbol: string,
  language: Language,
  options: NumberOptions = {},
): string {
  const decimals = options.decimals ?? moneyDecimals(value);
  return withSymbol(formatNumber(value, language, { ...options, decimals }), symbol, language);
}

export function formatAmount(value: number, language: Language): string {
  return formatNumber(value, language, { decimals: moneyDecimals(value) });
}

/** Large sums in words, such as "KM 3.1 million". */
export function formatLargeMoney(value: number, symbol: string, language: Language): string {
  const size = Math.abs(value);
  if (size < 1_000_000) {
    // Three figures: a sum for a population is no surer than that.
    const grain = 10 ** Math.max(0, Math.floor(Math.log10(size || 1)) - 2);
    return formatMoney(Math.round(value / grain) * grain, symbol, language);
  }
  const format = formatter(language, {
    notation: 'compact',
    compactDisplay: 'long',
    minimumSignificantDigits: 2,
    maximumSignificantDigits: 2,
  });
  const words = withMinus(format.format(value));
  // French counts in nouns: "4,7 millions de KM".
  if (language === 'fr') return `${words} de${NO_BREAK}${symbol}`;
  return withSymbol(words, symbol, language);
}

/** Health outcomes: three decimals, fewer where the number is large enough to read without. */
export function formatOutcome(value: number, language: Language, signed = false): string {
  const size = Math.abs(value);
  return formatNumber(value, language, { decimals: size >= 10_000 ? 0 : 3, signed });
}

/** Two decimals; what rounding would make certain is said to be below or above. */
export function formatProbability(value: number, language: Language): string {
  const two = (number: number) => formatNumber(number, language, { decimals: 2 });
  if (value > 0 && value < 0.005) return `<${NO_BREAK}${two(0.01)}`;
  if (value < 1 && value >= 0.995) return `>${NO_BREAK}${two(0.99)}`;
  return two(value);
}

/** A value of a parameter, to as many figures as it needs. */
export function formatValue(value: number, language: Language): string {
  return withMinus(formatter(language, { maximumSignificantDigits: 6 }).format(value));
}

export function formatPercent(share: number, language: Language): string {
  const format = formatter(language, { style: 'percent', maximumFractionDigits: 1 });
  return withMinus(format.format(share));
}

function moneyDecimals(value: number): number {
  const size = Math.abs(value);
  if (Number.isInteger(value) || size >= 100) return 0;
  return size >= 10 ? 1 : 2;
}

function withSymbol(number: string, symbol: string, language: Language): string {
  if (language === 'fr') return `${number}${NO_BREAK}${symbol}`;
  return /\p{L}$/u.test(symbol) ? `${symbol}${NO_BREAK}${number}` : `${symbol}${number}`;
}

/** The minus sign itself, as wide as a plus, in place of the hyphen that locales give. */
function withMinus(text: string): string {
  return text.replace('-', '\u2212');
}
