/** The words of the language that the page is written in, whatever the interface speaks. */
import type { i18n } from 'i18next';
import { useEffect, useState } from 'react';
import { wordsIn } from '../../../i18n/i18n.ts';
import type { Language } from '../../../store/settings.ts';

/** Null until they are there. */
export function useReportWords(language: Language): i18n | null {
  const [loaded, setLoaded] = useState<{ language: Language; words: i18n } | null>(null);
  useEffect(() => {
    let wanted = true;
    void wordsIn(language).then((words) => wanted && setLoaded({ language, words }));
    return () => {
      wanted = false;
    };
  }, [language]);
  return loaded?.language === language ? loaded.words : null;
}
