import { useTranslation } from 'react-i18next';
import type { ModelDocument } from '../../../shared/model/document.ts';
import type { Issue } from '../../../shared/model/issue.ts';
import { IssueList } from '../../components/issue-list.tsx';

/** Errors that the strip itself says. */
export const IN_STRIP = 3;

/** While something is broken in the model the strip says what and where, and no number. */
export function BrokenStrip({
  issues,
  document,
}: {
  issues: readonly Issue[];
  document: ModelDocument;
}) {
  const { t } = useTranslation();
  const errors = issues.filter(({ severity }) => severity === 'error');
  return (
    <section role="alert" className="border-b border-rule py-3">
      <p className="mb-1 text-lg font-bold text-clay">{t('strip.broken')}</p>
      <IssueList issues={errors} document={document} most={IN_STRIP} />
    </section>
  );
}
