import { useTranslation } from 'react-i18next';
import { speak } from '../i18n/i18n.ts';
import { LANGUAGE_NAMES } from '../i18n/language-names.ts';
import {
  changeSettings,
  LANGUAGES,
  type Language,
  THEMES,
  type Theme,
  useSettings,
} from '../store/settings.ts';

const SELECT = 'min-h-11 rounded-md border border-rule-strong bg-raised px-2 text-ink';

export function Preferences({ stacked = false }: { stacked?: boolean }) {
  const { t } = useTranslation();
  const { language, theme } = useSettings();
  return (
    <div className={stacked ? 'grid gap-3' : 'flex flex-wrap gap-x-4 gap-y-2'}>
      <label className={stacked ? 'grid gap-1' : 'flex items-center gap-2'}>
        <span className="text-sm text-mute">{t('preferences.language')}</span>
        <select
          className={SELECT}
          value={language}
          onChange={(event) => void speak(event.target.value as Language)}
        >
          {LANGUAGES.map((option) => (
            <option key={option} value={option} lang={option}>
              {LANGUAGE_NAMES[option]}
            </option>
          ))}
        </select>
      </label>
      <label className={stacked ? 'grid gap-1' : 'flex items-center gap-2'}>
        <span className="text-sm text-mute">{t('preferences.theme')}</span>
        <select
          className={SELECT}
          value={theme}
          onChange={(event) => changeSettings({ theme: event.target.value as Theme })}
        >
          {THEMES.map((option) => (
            <option key={option} value={option}>
              {t(`preferences.themes.${option}`)}
            </option>
          ))}
        </select>
      </label>
    </div>
  );
}
