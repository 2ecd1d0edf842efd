/** Up, down, duplicate and delete: what can be done with every thing of a list. */
import { type ReactNode, useState } from 'react';
import { useTranslation } from 'react-i18next';
import { type Duplicable, duplicate } from '../../../../shared/formula/edit/duplicate.ts';
import { type Removal, removalOf } from '../../../../shared/formula/edit/remove.ts';
import { stepEdits } from '../../../../shared/model/edit/reorder.ts';
import { itemsOf, listOf, type Target } from '../../../../shared/model/edit/target.ts';
import { useEditing } from './context.tsx';
import { RemovalDialog } from './removal-dialog.tsx';

interface ItemActionsProps {
  readonly target: Target;
  readonly label: string;
  /** What else can be done, before the rest. */
  readonly children?: ReactNode;
  /** Called with the id of a copy that was made. */
  readonly onCopy?: (id: string) => void;
}

export function ItemActions({ target, label, children, onCopy }: ItemActionsProps) {
  const { t } = useTranslation();
  const { document, edit } = useEditing();
  const [refused, setRefused] = useState<Removal | null>(null);
  const items = itemsOf(document, target.what);
  const index = items.findIndex(({ id }) => id === target.id);
  const step = (by: -1 | 1) => {
    const edits = stepEdits(items, listOf(target.what), target.id, by);
    edit(edits, t('editing.acts.moved', { what: label }));
  };
  const copy = () => {
    const name = t('editing.copyOf', { label });
    const { edits, id } = duplicate(document, target as Duplicable, name);
    edit(edits, t('editing.acts.duplicated', { what: label }));
    onCopy?.(id);
  };
  const remove = () => {
    const removal = removalOf(document, target);
    if (!removal.possible || removal.along.length > 0) return setRefused(removal);
    edit(removal.edits, t('editing.acts.removed', { what: label }));
  };
  return (
    <div className="flex flex-wrap items-center">
      {children}
      <Act name={t('editing.up', { label })} disabled={index <= 0} onClick={() => step(-1)}>
        <path d="M3 9 L8 4 L13 9 M8 4 V13" />
      </Act>
      <Act
        name={t('editing.down', { label })}
        disabled={index < 0 || index >= items.length - 1}
        onClick={() => step(1)}
      >
        <path d="M3 8 L8 13 L13 8 M8 13 V4" />
      </Act>
      {target.what !== 'group' && (
        <Act name={t('editing.duplicate', { label })} onClick={copy}>
          <path d="M6 6 H13 V13 H6 Z M10 6 V3 H3 V10 H6" />
        </Act>
      )}
      <Act name={t('editing.remove', { label })} onClick={remove}>
        <path d="M3 5 H13 M6 5 V3 H10 V5 M5 5 L5.6 13 H10.4 L11 5" />
      </Act>
      {refused && (
        <RemovalDialog
          target={target}
          label={label}
          removal={refused}
          onClose={() => setRefused(null)}
        />
      )}
    </div>
  );
}

interface ActProps {
  readonly name: string;
  readonly disabled?: boolean;
  readonly onClick: () => void;
  readonly children: ReactNode;
}

/** A button of one small picture, with its name for those who do not see it. */
export function Act({ name, disabled = false, onClick, children }: ActProps) {
  return (
    <button
      type="button"
      aria-label={name}
      title={name}
      disabled={disabled}
      onClick={onClick}
      className="inline-flex size-10 items-center justify-center rounded-md text-mute hover:text-ink disabled:opacity-35"
    >
      <svg
        width="16"
        height="16"
        viewBox="0 0 16 16"
        fill="none"
        stroke="currentColor"
        strokeWidth="1.6"
        aria-hidden="true"
      >
        {children}
      </svg>
    </button>
  );
}
