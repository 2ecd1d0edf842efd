import { useTranslation } from 'react-i18next';
import type { ModelDocument } from '../../shared/model/document.ts';
import type { Issue } from '../../shared/model/issue.ts';
import { issueExcerpt, issuePlace, issueWords } from '../i18n/issue-words.ts';
import { useSettings } from '../store/settings.ts';

interface IssueListProps {
  readonly issues: readonly Issue[];
  readonly document: ModelDocument | null;
  /** Show no more than so many, and say how many are left. */
  readonly most?: number;
}

/** Each issue: what is wrong, and where. */
export function IssueList({ issues, document, most = 20 }: IssueListProps) {
  const { t } = useTranslation();
  const { language } = useSettings();
  const left = issues.length - most;
  return (
    <ul className="grid gap-2">
      {issues.slice(0, most).map((issue) => (
        <li key={`${issue.code} ${issue.path.join('.')} ${JSON.stringify(issue.params)}`}>
          {issueWords(issue, { t, language, document })}
          <Excerpt issue={issue} document={document} />
          {issue.path.length > 0 && (
            <span className="block text-sm break-words text-mute">
              {t('issueList.where', { place: issuePlace(issue.path, document) })}
            </span>
          )}
        </li>
      ))}
      {left > 0 && <li className="text-mute">{t('issueList.more', { count: left })}</li>}
    </ul>
  );
}

function Excerpt({ issue, document }: { issue: Issue; document: ModelDocument | null }) {
  const excerpt = issueExcerpt(issue, document);
  if (!excerpt) return null;
  return (
    <code className="block font-sans text-sm break-words">
      {excerpt.before}
      <mark className="bg-clay-soft px-0.5 text-ink underline decoration-clay">{excerpt.part}</mark>
      {excerpt.after}
    </code>
  );
}
