import { useQuery } from '@tanstack/react-query';
import type { TFunction } from 'i18next';
import { useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import type { ModelDocument } from '../../../../shared/model/document.ts';
import { SelectField } from '../../../components/form/select-field.tsx';
import type { VersionRow } from '../../../store/database.ts';
import { completed } from '../../../store/versions.ts';
import { useSession } from '../session-context.ts';
import { Answers } from './answers.tsx';
import { Changes } from './changes.tsx';
import { DRAFT, type Pair } from './pair.ts';
import { versionName } from './version-name.ts';

interface ComparisonProps {
  readonly versions: readonly VersionRow[];
  readonly pair: Pair;
  readonly choose: (pair: Pair) => void;
}

/** What two versions differ in, and what that did to the answer. */
export function Comparison({ versions, pair, choose }: ComparisonProps) {
  const { t } = useTranslation();
  const draft = useCompleted(useSession().document);
  const options = useMemo(() => optionsOf(versions, t), [versions, t]);
  const find = (key: string): ModelDocument | null =>
    key === DRAFT ? draft : (versions.find(({ digest }) => digest === key)?.document ?? null);
  const before = find(pair.before);
  const after = find(pair.after);
  return (
    <section aria-labelledby="compare-title" className="mt-10">
      <h2 id="compare-title" className="border-b border-ink pb-1.5 text-lg">
        {t('history.compareTitle')}
      </h2>
      <div className="mt-4 grid max-w-[46em] gap-4 sm:grid-cols-2">
        <SelectField
          label={t('history.from')}
          value={pair.before}
          options={options}
          onValue={(value) => choose({ ...pair, before: value })}
        />
        <SelectField
          label={t('history.to')}
          value={pair.after}
          options={options}
          onValue={(value) => choose({ ...pair, after: value })}
        />
      </div>
      {before && after && (
        <>
          <Answers before={before} after={after} />
          <Changes before={before} after={after} />
        </>
      )}
    </section>
  );
}

function optionsOf(versions: readonly VersionRow[], t: TFunction) {
  const kept = versions.map((version, index) => ({
    value: version.digest,
    name: t('history.option', {
      number: versions.length - index,
      name: versionName(version, t),
    }),
  }));
  return [{ value: DRAFT, name: t('history.draft') }, ...kept];
}

/** The draft with its defaults filled in, as versions are kept. */
function useCompleted(document: ModelDocument): ModelDocument | null {
  const { data } = useQuery({
    queryKey: ['completed', document],
    // Documents are compared by what they are, never hashed whole for every keystroke.
    queryKeyHashFn: () => `completed ${numberOf(document)}`,
    queryFn: () => completed(document),
    structuralSharing: false,
  });
  return data ?? null;
}

const numbers = new WeakMap<ModelDocument, number>();
let count = 0;

function numberOf(document: ModelDocument): number {
  const number = numbers.get(document) ?? ++count;
  numbers.set(document, number);
  return number;
}
