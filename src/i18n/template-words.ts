import type { TemplateWords } from '../../shared/model/templates/template-words.ts';
import type { Language } from '../store/settings.ts';

const words: Readonly<Record<Language, () => Promise<TemplateWords>>> = {
  en: async () => (await import('./template-words-en.ts')).templateWords,
  fr: async () => (await import('./template-words-fr.ts')).templateWords,
};

/** What a template is worded with; fetched when one is begun from. */
export function templateWords(language: Language): Promise<TemplateWords> {
  return words[language]();
}
