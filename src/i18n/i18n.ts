/**
 * Words of the interface. A language is fetched when it is first used; both are in the
 * precache, so a change of language works with no network.
 */
import i18next, { type i18n } from 'i18next';
import { initReactI18next } from 'react-i18next';
import { changeSettings, type Language } from '../store/settings.ts';

const words = {
  en: async () => (await import('./en.ts')).en,
  fr: async () => (await import('./fr.ts')).fr,
};

export async function startWords(language: Language): Promise<void> {
  await i18next.use(initReactI18next).init({
    lng: language,
    resources: { [language]: { translation: await words[language]() } },
    fallbackLng: false,
    // React escapes what it renders.
    interpolation: { escapeValue: false },
    react: { useSuspense: false },
    returnNull: false,
  });
  document.documentElement.lang = language;
}

export async function speak(language: Language): Promise<void> {
  await fetchWords(language);
  await i18next.changeLanguage(language);
  document.documentElement.lang = language;
  changeSettings({ language });
}

/** The words of a language other than the interface's, for a page that is written in it. */
export async function wordsIn(language: Language): Promise<i18n> {
  await fetchWords(language);
  const instance = i18next.cloneInstance({ lng: language });
  await instance.changeLanguage(language);
  return instance;
}

async function fetchWords(language: Language): Promise<void> {
  if (i18next.hasResourceBundle(language, 'translation')) return;
  i18next.addResourceBundle(language, 'translation', await words[language]());
}
