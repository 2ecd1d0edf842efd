/** One field that leads anywhere in the appraisal: by its button, or by Ctrl or Cmd with K. */
import { lazy, Suspense, useEffect, useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { ModelDocument } from '../../../shared/model/document.ts';
import type { Entry } from './entry.ts';

const FinderDialog = lazy(async () => ({
  default: (await import('./finder-dialog.tsx')).FinderDialog,
}));

export interface FinderProps {
  readonly document: ModelDocument;
  /** Steps and actions: what the document does not name. */
  readonly entries: readonly Entry[];
  /** Goes to an address within the appraisal, to the thing there with that id. */
  readonly go: (to: string, id: string) => void;
}

export function Finder(props: FinderProps) {
  const { t } = useTranslation();
  const [isOpen, setOpen] = useState(false);
  useEffect(() => {
    const onKey = (event: KeyboardEvent) => {
      const { key, ctrlKey, metaKey, altKey, shiftKey } = event;
      if (event.defaultPrevented || altKey || shiftKey || !(ctrlKey || metaKey)) return;
      if (key.toLowerCase() !== 'k') return;
      event.preventDefault();
      setOpen(true);
    };
    document.addEventListener('keydown', onKey);
    return () => document.removeEventListener('keydown', onKey);
  }, []);
  return (
    <>
      <button
        type="button"
        aria-keyshortcuts="Control+K Meta+K"
        className="flex min-h-11 items-center px-1 underline decoration-rule-strong underline-offset-4 hover:decoration-ink"
        onClick={() => setOpen(true)}
      >
        {t('finder.open')}
      </button>
      {isOpen && (
        <Suspense fallback={null}>
          <FinderDialog {...props} onClose={() => setOpen(false)} />
        </Suspense>
      )}
    </>
  );
}
