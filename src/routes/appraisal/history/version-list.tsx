import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { INPUT } from '../../../components/form/field.tsx';
import { formatTime } from '../../../i18n/format-time.ts';
import type { VersionRow } from '../../../store/database.ts';
import { useSettings } from '../../../store/settings.ts';
import { type StoreCode, storeCode } from '../../../store/store-error.ts';
import { nameVersion } from '../../../store/versions.ts';
import { exportDocument } from '../export-document.ts';
import { useSession } from '../session-context.ts';
import { versionName } from './version-name.ts';

interface VersionListProps {
  /** Newest first. */
  readonly versions: readonly VersionRow[];
  /** Sets a version against the work as it stands. */
  readonly compare: (digest: string) => void;
}

export function VersionList({ versions, compare }: VersionListProps) {
  const { t } = useTranslation();
  const [failed, setFailed] = useState<StoreCode | null>(null);
  const attempt = (work: Promise<unknown>) => {
    setFailed(null);
    void work.catch((problem) => setFailed(storeCode(problem)));
  };
  return (
    <section aria-labelledby="versions-title" className="mt-2">
      <h2 id="versions-title" className="border-b border-ink pb-1.5 text-lg">
        {t('history.versions')}
      </h2>
      <p role="alert" className="text-clay">
        {failed && t(failed)}
      </p>
      <ol>
        {versions.map((version) => (
          <Version key={version.digest} version={version} attempt={attempt} compare={compare} />
        ))}
      </ol>
    </section>
  );
}

interface VersionProps extends Pick<VersionListProps, 'compare'> {
  readonly version: VersionRow;
  readonly attempt: (work: Promise<unknown>) => void;
}

function Version({ version, attempt, compare }: VersionProps) {
  const { t } = useTranslation();
  const { language } = useSettings();
  const { session, state, readOnly } = useSession();
  const [naming, setNaming] = useState(false);
  const { digest, author, message, time } = version;
  const name = versionName(version, t);
  const isCurrent = state.appraisal?.head === digest;
  const facts = [formatTime(time, language), author, isCurrent && t('history.current')];
  return (
    <li className="border-b border-rule py-3 lg:grid lg:grid-cols-[1fr_auto] lg:items-center lg:gap-x-8">
      <div className="min-w-0">
        {naming ? (
          <NameForm
            first={version.name ?? ''}
            done={(next) => {
              setNaming(false);
              if (next !== null) attempt(nameVersion(digest, next));
            }}
          />
        ) : (
          <p className="font-bold break-words">{name}</p>
        )}
        {version.name && message && <p className="break-words">{message}</p>}
        <p className="text-sm text-mute">{facts.filter(Boolean).join(' · ')}</p>
        <p className="text-sm text-mute">
          {t('history.digest')} <code className="font-sans">{digest.slice(0, 12)}</code>
        </p>
      </div>
      <p className="flex flex-wrap gap-x-4">
        <Act name={t('history.compare')} of={name} act={() => compare(digest)} />
        <Act
          name={t('history.goBack')}
          of={name}
          off={readOnly || (isCurrent && !state.changed)}
          act={() => attempt(session.goBackTo(digest, t('history.wentBack', { name })))}
        />
        <Act name={t('history.rename')} of={name} act={() => setNaming(true)} />
        <Act
          name={t('own.export')}
          of={name}
          act={() => attempt(exportDocument(version.document))}
        />
      </p>
    </li>
  );
}

interface ActProps {
  readonly name: string;
  readonly of: string;
  readonly off?: boolean;
  readonly act: () => void;
}

function Act({ name, of, off = false, act }: ActProps) {
  return (
    <button
      type="button"
      aria-label={`${name}: ${of}`}
      disabled={off}
      className="min-h-11 text-sm underline decoration-rule-strong underline-offset-4 hover:decoration-ink disabled:text-mute disabled:no-underline"
      onClick={act}
    >
      {name}
    </button>
  );
}

/** @param done told the name, or null where it is left as it was */
function NameForm({ first, done }: { first: string; done: (name: string | null) => void }) {
  const { t } = useTranslation();
  const [text, setText] = useState(first);
  return (
    <form
      data-own-undo
      className="flex flex-wrap gap-2"
      onSubmit={(event) => {
        event.preventDefault();
        done(text);
      }}
    >
      <input
        aria-label={t('history.name')}
        className={`${INPUT} flex-1 basis-48`}
        value={text}
        maxLength={100}
        // biome-ignore lint/a11y/noAutofocus: the reader has just asked for the field
        autoFocus
        onChange={(event) => setText(event.target.value)}
        onKeyDown={({ key }) => key === 'Escape' && done(null)}
      />
      <button type="submit" className="control">
        {t('history.keepName')}
      </button>
    </form>
  );
}
