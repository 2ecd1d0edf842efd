import type { Language } from '../store/settings.ts';

export const HELP_TOPICS = [
  'appraisals',
  'question',
  'evidence',
  'model',
  'results',
  'uncertainty',
  'brief',
  'history',
  'settings',
] as const;
export type HelpTopic = (typeof HELP_TOPICS)[number];

/** What there is to say about one step. */
interface TopicWords {
  readonly what: string;
  /** In the order in which they are done. */
  readonly todo: readonly string[];
  readonly wrong: readonly string[];
}

export interface HelpWords {
  readonly headings: Readonly<Record<keyof TopicWords, string>>;
  readonly topics: Readonly<Record<HelpTopic, TopicWords>>;
}

const words: Readonly<Record<Language, () => Promise<HelpWords>>> = {
  en: async () => (await import('./help-en.ts')).help,
  fr: async () => (await import('./help-fr.ts')).help,
};

const asked = new Map<Language, Promise<HelpWords>>();

/** The help in a language, fetched when it is first asked for: the same promise each time. */
export function helpWords(language: Language): Promise<HelpWords> {
  const fetched = asked.get(language) ?? words[language]();
  asked.set(language, fetched);
  return fetched;
}
