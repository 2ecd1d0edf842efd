import type { Language } from '../store/settings.ts';

/** Each language by its own name, so that a reader finds theirs in any of them. */
export const LANGUAGE_NAMES: Readonly<Record<Language, string>> = { en: 'English', fr: 'Français' };
