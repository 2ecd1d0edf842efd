/**
 * What the reader chose, kept in this browser: language, theme, and where the poise last
 * stood in each appraisal. public/theme.js reads the same entry before the first paint.
 */
import { useSyncExternalStore } from 'react';

export const LANGUAGES = ['en', 'fr'] as const;
export type Language = (typeof LANGUAGES)[number];
export const THEMES = ['system', 'light', 'dark'] as const;
export type Theme = (typeof THEMES)[number];

export interface Settings {
  readonly language: Language;
  readonly theme: Theme;
  /** Money per unit of outcome, by appraisal. */
  readonly thresholds: Readonly<Record<string, number>>;
  /** Draws that a new appraisal begins with. */
  readonly samples: number;
  /** Simulators at work at once; null where the device's cores decide. */
  readonly workers: number | null;
}

/** Draws of a new appraisal where the reader chose no other number. */
export const FIRST_SAMPLES = 1_000;

const KEY = 'steelyard.settings';
const listeners = new Set<() => void>();
let current: Settings | null = null;

export function getSettings(): Settings {
  current ??= read();
  return current;
}

export function changeSettings(change: Partial<Settings>): void {
  current = { ...getSettings(), ...change };
  try {
    localStorage.setItem(KEY, JSON.stringify(current));
  } catch {
    // A full or barred storage: the choice still holds until the page is closed.
  }
  for (const listener of listeners) listener();
}

export function subscribeSettings(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

export function useSettings(): Settings {
  return useSyncExternalStore(subscribeSettings, getSettings);
}

/** Reads what is kept, part by part: a spoilt entry costs only itself. */
function read(): Settings {
  const kept = parse();
  return {
    language: LANGUAGES.find((language) => language === kept.language) ?? deviceLanguage(),
    theme: THEMES.find((theme) => theme === kept.theme) ?? 'system',
    thresholds: numbersOf(kept.thresholds),
    samples: wholeOf(kept.samples, 0, 1_000_000) ?? FIRST_SAMPLES,
    workers: wholeOf(kept.workers, 1, 64),
  };
}

function parse(): Record<string, unknown> {
  try {
    const kept: unknown = JSON.parse(localStorage.getItem(KEY) ?? '{}');
    return typeof kept === 'object' && kept !== null ? (kept as Record<string, unknown>) : {};
  } catch {
    return {};
  }
}

function numbersOf(value: unknown): Record<string, number> {
  if (typeof value !== 'object' || value === null) return {};
  const isAmount = (entry: [string, unknown]): entry is [string, number] =>
    typeof entry[1] === 'number' && Number.isFinite(entry[1]) && entry[1] >= 0;
  return Object.fromEntries(Object.entries(value).filter(isAmount));
}

function wholeOf(value: unknown, min: number, max: number): number | null {
  const isWhole = typeof value === 'number' && Number.isInteger(value);
  return isWhole && value >= min && value <= max ? value : null;
}

/** The first of the device's languages that the interface speaks; English otherwise. */
function deviceLanguage(): Language {
  for (const tag of navigator.languages ?? []) {
    const match = LANGUAGES.find((language) => tag.toLowerCase().split('-')[0] === language);
    if (match) return match;
  }
  return 'en';
}
