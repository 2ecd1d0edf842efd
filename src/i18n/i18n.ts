/**
 * Words of the interface. A language is fetched when it is first used; both are in the
 * precache, so a change of language works with no network.
 */
import i18next from 'i18next';
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
  if (!i18next.hasResourceBundle(language, 'translation')) {
    i18next.addResourceBundle(language, 'translation', await words[language]());
  }
  await i18next.changeLanguage(language);
  document.documentElement.lang = language;
  changeSettings({ language });
}
