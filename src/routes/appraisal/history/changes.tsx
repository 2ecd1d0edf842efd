import { useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import { type Change, compareDocuments } from '../../../../shared/model/compare/compare.ts';
import type { ModelDocument } from '../../../../shared/model/document.ts';
import { useSettings } from '../../../store/settings.ts';
import { changedValue, placeWords } from './change-words.ts';

const NATURES = ['input', 'formula', 'structure', 'words'] as const;
/** Shown at once of each sort. */
const MOST = 60;

interface ChangesProps {
  readonly before: ModelDocument;
  readonly after: ModelDocument;
}

/** Every change, by what it is: numbers, formulas, how the model is put together, words. */
export function Changes({ before, after }: ChangesProps) {
  const { t } = useTranslation();
  const changes = useMemo(() => compareDocuments(before, after), [before, after]);
  if (changes.length === 0) return <p className="mt-5">{t('history.same')}</p>;
  return (
    <div className="mt-5 grid gap-5">
      {NATURES.map((nature) => (
        <Sort
          key={nature}
          title={t(`history.natures.${nature}`)}
          changes={changes.filter((change) => change.nature === nature)}
          document={after}
        />
      ))}
    </div>
  );
}

interface SortProps {
  readonly title: string;
  readonly changes: readonly Change[];
  readonly document: ModelDocument;
}

function Sort({ title, changes, document }: SortProps) {
  const { t } = useTranslation();
  if (changes.length === 0) return null;
  return (
    <div>
      <h3 className="text-base">
        {title} <span className="font-normal text-mute">({changes.length})</span>
      </h3>
      <ul>
        {changes.slice(0, MOST).map((change) => (
          <Line
            key={`${change.kind} ${JSON.stringify(change.place)}`}
            change={change}
            document={document}
          />
        ))}
      </ul>
      {changes.length > MOST && (
        <p className="text-mute">{t('issueList.more', { count: changes.length - MOST })}</p>
      )}
    </div>
  );
}

function Line({ change, document }: { change: Change; document: ModelDocument }) {
  const { t } = useTranslation();
  const { language } = useSettings();
  const reader = { document, t, language };
  const { kind } = change;
  return (
    <li className="border-b border-rule py-2 sm:grid sm:grid-cols-[1fr_1fr] sm:gap-x-6">
      <p className="min-w-0 break-words">{placeWords(change, reader)}</p>
      <p className="min-w-0 break-words">
        {kind === 'changed' ? (
          <>
            <del className="text-mute no-underline">
              <span className="sr-only">{t('history.before')} </span>
              {changedValue(change, change.before, reader)}
            </del>
            <span aria-hidden="true"> → </span>
            <ins className="font-bold no-underline">
              <span className="sr-only">{t('history.after')} </span>
              {changedValue(change, change.after, reader)}
            </ins>
          </>
        ) : (
          <span className={kind === 'removed' ? 'text-clay' : 'text-gain'}>
            {t(`history.kinds.${kind}`)}
          </span>
        )}
      </p>
    </li>
  );
}
