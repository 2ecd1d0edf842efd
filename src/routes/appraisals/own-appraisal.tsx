import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import { INPUT } from '../../components/form/field.tsx';
import { formatTime } from '../../i18n/format-time.ts';
import { duplicateAppraisal, renameAppraisal } from '../../store/appraisals.ts';
import type { AppraisalRow } from '../../store/database.ts';
import { openAppraisal } from '../../store/open-sessions.ts';
import { useSettings } from '../../store/settings.ts';
import { exportDocument } from '../appraisal/export-document.ts';

interface OwnAppraisalProps {
  readonly appraisal: AppraisalRow;
  /** Runs an act and tells what went wrong with it. */
  readonly attempt: (work: () => Promise<void>) => Promise<void>;
  readonly remove: () => void;
}

export function OwnAppraisal({ appraisal, attempt, remove }: OwnAppraisalProps) {
  const { t } = useTranslation();
  const { language } = useSettings();
  const [renaming, setRenaming] = useState(false);
  const { id, title, openedAt } = appraisal;
  const rename = (next: string) => {
    setRenaming(false);
    if (next.trim() === '' || next === title) return;
    void attempt(() => renameAppraisal(id, next.trim(), t('own.rename')));
  };
  const copy = () =>
    attempt(async () => void (await duplicateAppraisal(id, t('own.copyOf', { title }))));
  const save = () =>
    attempt(async () => {
      const session = await openAppraisal(id);
      if (session) await exportDocument(session.getState().document);
    });
  return (
    <li className="border-b border-rule py-3 sm:grid sm:grid-cols-[1fr_auto] sm:items-center sm:gap-x-8">
      <div className="min-w-0">
        {renaming ? (
          <Rename title={title} rename={rename} />
        ) : (
          <h3 className="text-lg break-words">
            <Link
              to={`/appraisals/${id}/question`}
              className="inline-flex min-h-11 items-center underline decoration-rule-strong underline-offset-4 hover:decoration-ink"
            >
              {title}
            </Link>
          </h3>
        )}
        <p className="text-sm text-mute">
          {t('own.opened', { time: formatTime(openedAt, language) })}
        </p>
      </div>
      <p className="flex flex-wrap gap-x-4">
        <Act name={t('own.rename')} of={title} act={() => setRenaming(true)} />
        <Act name={t('own.duplicate')} of={title} act={() => void copy()} />
        <Act name={t('own.export')} of={title} act={() => void save()} />
        <Act name={t('own.delete')} of={title} act={remove} />
      </p>
    </li>
  );
}

function Act({ name, of, act }: { name: string; of: string; act: () => void }) {
  return (
    <button
      type="button"
      aria-label={`${name}: ${of}`}
      className="min-h-11 text-sm underline decoration-rule-strong underline-offset-4 hover:decoration-ink"
      onClick={act}
    >
      {name}
    </button>
  );
}

function Rename({ title, rename }: { title: string; rename: (title: string) => void }) {
  const { t } = useTranslation();
  const [text, setText] = useState(title);
  return (
    <form
      className="flex flex-wrap gap-2"
      onSubmit={(event) => {
        event.preventDefault();
        rename(text);
      }}
    >
      <input
        aria-label={t('own.newTitle')}
        className={`${INPUT} flex-1 basis-48`}
        value={text}
        maxLength={300}
        // biome-ignore lint/a11y/noAutofocus: the reader has just asked for the field
        autoFocus
        onChange={(event) => setText(event.target.value)}
        onKeyDown={({ key }) => key === 'Escape' && rename(title)}
      />
      <button type="submit" className="control">
        {t('own.save')}
      </button>
    </form>
  );
}
