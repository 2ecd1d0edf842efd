import { type DragEvent, useRef, useState } from 'react';
import { useTranslation } from 'react-i18next';
import { useNavigate } from 'react-router-dom';
import type { ModelDocument } from '../../../shared/model/document.ts';
import type { Issue } from '../../../shared/model/issue.ts';
import { IssueList } from '../../components/issue-list.tsx';
import { beginFromText } from '../../store/begin.ts';

type Reading =
  | { readonly status: 'idle' }
  | { readonly status: 'reading' }
  | {
      readonly status: 'refused';
      readonly file: string;
      readonly issues: readonly Issue[];
      /** What could be read of it, to say places by their names. */
      readonly draft: ModelDocument | null;
    }
  | { readonly status: 'unreadable'; readonly file: string };

/** The reader's own model: picked or dropped, read, and opened where nothing is wrong. */
export function OpenFile() {
  const { t } = useTranslation();
  const picker = useRef<HTMLInputElement>(null);
  const [over, setOver] = useState(false);
  const [reading, read] = useReading();
  const drop = (event: DragEvent) => {
    event.preventDefault();
    setOver(false);
    read(event.dataTransfer.files[0]);
  };
  return (
    <>
      {/* biome-ignore lint/a11y/noStaticElementInteractions: dropping is one way more; the button does the same */}
      <div
        onDragOver={(event) => {
          event.preventDefault();
          setOver(true);
        }}
        onDragLeave={() => setOver(false)}
        onDrop={drop}
        className={`mt-4 flex flex-wrap items-center gap-x-5 gap-y-3 rounded-md border border-dashed p-4 ${over ? 'border-brass bg-brass-soft' : 'border-rule-strong'}`}
      >
        <button type="button" className="control" onClick={() => picker.current?.click()}>
          {t('openFile.choose')}
        </button>
        <p className="min-w-0 flex-1 basis-64 text-mute">{t('openFile.body')}</p>
        <input
          ref={picker}
          type="file"
          accept=".json,application/json"
          className="hidden"
          aria-label={t('openFile.choose')}
          onChange={(event) => {
            read(event.target.files?.[0]);
            event.target.value = '';
          }}
        />
      </div>
      <Outcome reading={reading} />
    </>
  );
}

function useReading(): [Reading, (file: File | undefined) => void] {
  const navigate = useNavigate();
  const [reading, setReading] = useState<Reading>({ status: 'idle' });
  const read = async (file: File | undefined) => {
    if (!file) return;
    setReading({ status: 'reading' });
    try {
      const { address, issues, document } = await beginFromText(await file.text());
      if (address !== null) return await navigate(`/appraisals/${address}/results`);
      setReading({ status: 'refused', file: file.name, issues, draft: document });
    } catch {
      // A folder, or a file that was moved or taken away meanwhile.
      setReading({ status: 'unreadable', file: file.name });
    }
  };
  return [reading, (file) => void read(file)];
}

function Outcome({ reading }: { reading: Reading }) {
  const { t } = useTranslation();
  return (
    <div role="status" className="mt-3">
      {reading.status === 'reading' && <p className="text-mute">{t('openFile.reading')}</p>}
      {reading.status === 'unreadable' && (
        <p className="text-clay">{t('openFile.unreadable', { file: reading.file })}</p>
      )}
      {reading.status === 'refused' && (
        <div className="border-l-4 border-clay pl-4">
          <p className="mb-2 font-bold text-clay">
            {t('openFile.refused', { file: reading.file })}
          </p>
          <IssueList issues={reading.issues} document={reading.draft} />
        </div>
      )}
    </div>
  );
}
