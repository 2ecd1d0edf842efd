import { useTranslation } from 'react-i18next';
import { useNavigate } from 'react-router-dom';
import type { Entry } from '../../features/finder/entry.ts';
import type { RailStep } from '../../features/rail/rail.tsx';
import { speak } from '../../i18n/i18n.ts';
import { LANGUAGE_NAMES } from '../../i18n/language-names.ts';
import { changeSettings, LANGUAGES, THEMES, useSettings } from '../../store/settings.ts';
import { useSession } from './session-context.ts';

/** Steps and actions for the finder; an action that would do nothing now is left out. */
export function useFinderEntries(steps: readonly RailStep[], showKeys: () => void): Entry[] {
  const { t } = useTranslation();
  const navigate = useNavigate();
  const { language, theme } = useSettings();
  const go = (to: string) => () => void navigate(to);
  const action = (id: string, name: string, act: () => void): Entry => ({
    id: `action-${id}`,
    kind: 'action',
    name,
    act,
  });
  return [
    ...steps.map(({ to, name }): Entry => ({ id: to, kind: 'step', name, act: go(to) })),
    ...useUndoEntries(action),
    action('save', t('history.save'), go('history')),
    action('print', t('finder.acts.print'), go('brief')),
    action('settings', t('shell.settings'), go('/settings')),
    action('keys', t('keys.title'), showKeys),
    ...LANGUAGES.filter((each) => each !== language).map((each) =>
      action(
        `language-${each}`,
        t('finder.acts.language', { language: LANGUAGE_NAMES[each] }),
        () => void speak(each),
      ),
    ),
    ...THEMES.filter((each) => each !== theme).map((each) =>
      action(
        `theme-${each}`,
        t('finder.acts.theme', { theme: t(`preferences.themes.${each}`) }),
        () => changeSettings({ theme: each }),
      ),
    ),
    action('appraisals', t('rail.all'), go('/')),
  ];
}

function useUndoEntries(action: (id: string, name: string, act: () => void) => Entry): Entry[] {
  const { t } = useTranslation();
  const { state, undo, redo, readOnly } = useSession();
  if (readOnly) return [];
  return [
    ...(state.undo ? [action('undo', t('shell.undoWhat', { what: state.undo.label }), undo)] : []),
    ...(state.redo ? [action('redo', t('shell.redoWhat', { what: state.redo.label }), redo)] : []),
  ];
}
