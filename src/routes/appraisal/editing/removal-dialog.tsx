import { useEffect, useRef } from 'react';
import { useTranslation } from 'react-i18next';
import { type Removal, removalOf } from '../../../../shared/formula/edit/remove.ts';
import type { Target } from '../../../../shared/model/edit/target.ts';
import type { Use } from '../../../../shared/model/edit/use.ts';
import { useEditing } from './context.tsx';

interface RemovalDialogProps {
  readonly target: Target;
  readonly label: string;
  readonly removal: Removal;
  readonly onClose: () => void;
}

/** Asked once before a thing goes that is used: where, and what can be done. */
export function RemovalDialog({ target, label, removal, onClose }: RemovalDialogProps) {
  const { t } = useTranslation();
  const { document, edit } = useEditing();
  const dialog = useRef<HTMLDialogElement>(null);
  useEffect(() => {
    const element = dialog.current;
    // jsdom knows no modal dialogs.
    if (element?.showModal) element.showModal();
    else element?.setAttribute('open', '');
  }, []);
  const put = (chosen: Removal) => {
    if (chosen.possible) edit(chosen.edits, t('editing.acts.removed', { what: label }));
    onClose();
  };
  const uses = removal.possible ? removal.along : removal.uses;
  return (
    <dialog
      ref={dialog}
      aria-labelledby={`remove-${target.id}`}
      onClose={onClose}
      className="m-auto max-h-[85dvh] w-[32rem] max-w-[92vw] rounded-md border border-rule-strong bg-paper p-5 text-ink backdrop:bg-[rgb(0_0_0/0.5)]"
    >
      <h2 id={`remove-${target.id}`} className="text-lg">
        {t('editing.removal.title', { label })}
      </h2>
      <p className="mt-2">{t(`editing.removal.${saying(removal)}`)}</p>
      {uses.length > 0 && (
        <ul className="mt-2 grid gap-1 border-l-2 border-rule pl-3 text-sm">
          {uses.map((use) => (
            <li key={`${use.role} ${JSON.stringify(use.place)}`}>
              <UseWords use={use} />
            </li>
          ))}
        </ul>
      )}
      <div className="mt-5 flex flex-wrap gap-3">
        {removal.possible && (
          <button type="button" className="control-primary" onClick={() => put(removal)}>
            {t('editing.removal.withThem')}
          </button>
        )}
        {!removal.possible && removal.replaceable && (
          <button
            type="button"
            className="control-primary"
            onClick={() => put(removalOf(document, target, { replace: true }))}
          >
            {t('editing.removal.replace')}
          </button>
        )}
        <button type="button" className="control" onClick={onClose}>
          {t('editing.removal.keep')}
        </button>
      </div>
    </dialog>
  );
}

function saying(removal: Removal) {
  if (removal.possible) return 'along';
  if (removal.why !== 'inUse') return removal.why;
  return removal.replaceable ? 'inUse' : 'inUseForGood';
}

function UseWords({ use }: { use: Use }) {
  const { t } = useTranslation();
  const role = t(`editing.roles.${use.role}`);
  return use.label === '' ? role : t('editing.use', { role, label: use.label });
}
