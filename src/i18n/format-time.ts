/** Days and hours by this device's clock, as the reader's language writes them. */
import type { Language } from '../store/settings.ts';

// A day before its month, in English too: the reader may be anywhere.
const LOCALES: Readonly<Record<Language, string>> = { en: 'en-GB', fr: 'fr' };

/** @param time milliseconds since 1970 */
export function formatTime(time: number, language: Language): string {
  const style = { dateStyle: 'medium', timeStyle: 'short' } as const;
  return new Intl.DateTimeFormat(LOCALES[language], style).format(time);
}
