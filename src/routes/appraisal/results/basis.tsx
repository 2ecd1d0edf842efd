/** What costs and health are taken from: the base case, or the means over the draws. */
import type { TFunction } from 'i18next';
import { useTranslation } from 'react-i18next';
import type { Basis, Result } from '../context.ts';

export function BasisChoice({ result }: { result: Result }) {
  const { t } = useTranslation();
  if (result.run.state.status !== 'done') return null;
  return (
    <fieldset className="flex flex-wrap items-center gap-2">
      <legend className="float-left mr-3 text-sm text-mute">{t('beam.basis')}</legend>
      {(['base', 'mean'] as const).map((basis) => (
        <button
          key={basis}
          type="button"
          aria-pressed={basis === result.basis}
          className="control px-3 text-sm aria-pressed:border-brass aria-pressed:bg-brass-soft"
          onClick={() => result.setBasis(basis)}
        >
          {wordsOf(basis, result, t)}
        </button>
      ))}
    </fieldset>
  );
}

/** The basis in force, in words. */
export function basisWords(result: Result, t: TFunction): string {
  return wordsOf(result.basis, result, t);
}

function wordsOf(basis: Basis, { run }: Result, t: TFunction): string {
  if (basis === 'base' || run.state.status !== 'done') return t('beam.base');
  return t('beam.mean', { count: run.state.draws.cost[0]?.length ?? 0 });
}
