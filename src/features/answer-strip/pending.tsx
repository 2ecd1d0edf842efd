import { useTranslation } from 'react-i18next';
import { formatNumber } from '../../i18n/format.ts';
import type { DrawsRun } from '../../store/draws.ts';
import type { Language } from '../../store/settings.ts';

/** In place of a number that waits for the draws: how far they are, and a way to stop. */
export function Pending({ run, language }: { run: DrawsRun; language: Language }) {
  const { t } = useTranslation();
  const { state } = run;
  if (state.status === 'none') return <span className="text-mute">{t('strip.noDraws')}</span>;
  if (state.status === 'done') return null;
  if (state.status === 'failed') {
    return <Small action={run.run} label={t('draws.again')} words={t('draws.failed')} />;
  }
  const share = {
    done: formatNumber(state.done, language),
    total: formatNumber(state.total, language),
  };
  if (state.status === 'stopped') {
    return <Small action={run.run} label={t('draws.again')} words={t('draws.stopped', share)} />;
  }
  return (
    <span className="block text-sm font-normal text-mute">
      <progress
        aria-label={t('draws.running')}
        className="block h-2 w-full max-w-40 accent-brass"
        value={state.done}
        max={state.total}
      />
      <Small action={run.stop} label={t('draws.stop')} words={t('draws.progress', share)} />
    </span>
  );
}

function Small({ action, label, words }: { action: () => void; label: string; words: string }) {
  return (
    <span className="flex flex-wrap items-center gap-x-3 text-sm font-normal text-mute">
      {words}
      <button
        type="button"
        className="min-h-8 text-ink underline underline-offset-4"
        onClick={action}
      >
        {label}
      </button>
    </span>
  );
}
