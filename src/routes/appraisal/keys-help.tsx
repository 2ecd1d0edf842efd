import { type RefObject, useEffect } from 'react';
import { useTranslation } from 'react-i18next';
import { KeysList } from '../../components/keys-list.tsx';

/** The keys, one key away: a question mark opens them wherever nothing is being typed. */
export function KeysHelp({ dialog }: { dialog: RefObject<HTMLDialogElement | null> }) {
  const { t } = useTranslation();
  useEffect(() => {
    const onKey = (event: KeyboardEvent) => {
      const { key, ctrlKey, metaKey, altKey, target } = event;
      if (key !== '?' || ctrlKey || metaKey || altKey) return;
      if (target instanceof Element && target.closest('input, textarea, select')) return;
      if (!dialog.current?.open) dialog.current?.showModal();
    };
    document.addEventListener('keydown', onKey);
    return () => document.removeEventListener('keydown', onKey);
  }, [dialog]);
  return (
    <dialog
      ref={dialog}
      aria-label={t('keys.title')}
      className="m-auto max-h-[85dvh] w-[36rem] max-w-[92vw] rounded-md border border-rule-strong bg-paper p-5 text-ink backdrop:bg-[rgb(0_0_0/0.5)]"
    >
      <h2 className="mb-2 text-lg">{t('keys.title')}</h2>
      <KeysList />
      <button type="button" className="control mt-5" onClick={() => dialog.current?.close()}>
        {t('shell.dismiss')}
      </button>
    </dialog>
  );
}
