import { useTranslation } from 'react-i18next';
import type { Issue } from '../../../../shared/model/issue.ts';
import { issueWords } from '../../../i18n/issue-words.ts';
import { useEditing } from './context.tsx';

const MOST = 4;

/** What is wrong with the thing that stands above. */
export function IssueLines({ issues }: { issues: readonly Issue[] }) {
  const { t } = useTranslation();
  const { document, language } = useEditing();
  if (issues.length === 0) return null;
  return (
    <ul className="mt-1 grid gap-1 text-sm">
      {issues.slice(0, MOST).map((issue) => (
        <li
          key={`${issue.code} ${issue.path.join('.')} ${JSON.stringify(issue.params)}`}
          className={issue.severity === 'error' ? 'text-clay' : 'text-brass'}
        >
          {issueWords(issue, { t, language, document })}
        </li>
      ))}
    </ul>
  );
}
