import { type KeyboardEvent, useDeferredValue, useEffect, useId, useRef, useState } from 'react';
import { useTranslation } from 'react-i18next';
import { INPUT } from '../../components/form/field.tsx';
import { documentEntries } from './document-entries.ts';
import type { Entry } from './entry.ts';
import type { FinderProps } from './finder.tsx';
import { matching } from './match.ts';

/** More than this is not read through; writing on narrows it down. */
const SHOWN = 50;

/** A combobox whose list is always open: the focus stays in the field, the keys move a mark. */
export function FinderDialog({
  document,
  entries,
  go,
  onClose,
}: FinderProps & { onClose: () => void }) {
  const { t } = useTranslation();
  const dialog = useRef<HTMLDialogElement>(null);
  const listId = useId();
  const [text, setText] = useState('');
  const [marked, setMarked] = useState(0);
  const sought = useDeferredValue(text);
  const found = matching([...entries, ...documentEntries(document, go)], sought, (kind) =>
    t(`finder.kinds.${kind}`),
  );
  const shown = found.slice(0, SHOWN);
  const at = Math.min(marked, shown.length - 1);
  const idAt = (index: number) => `${listId}-${index}`;
  useEffect(() => {
    if (!dialog.current?.open) dialog.current?.showModal();
  }, []);
  useEffect(() => {
    window.document.getElementById(`${listId}-${at}`)?.scrollIntoView?.({ block: 'nearest' });
  }, [listId, at]);
  const close = () => dialog.current?.close();
  /** The dialog closes first, so that the focus is back before the act moves it. */
  const choose = (entry: Entry | undefined) => {
    if (!entry) return;
    close();
    entry.act();
  };
  const onKeyDown = (event: KeyboardEvent) => {
    // The keys of an input method belong to it.
    if (event.nativeEvent.isComposing) return;
    if (event.key === 'Escape') close();
    else if (event.key === 'Enter') choose(shown[at]);
    else {
      const next = moved(event.key, at, shown.length);
      if (next === null) return;
      setMarked(next);
    }
    event.preventDefault();
  };
  return (
    <dialog
      ref={dialog}
      aria-label={t('finder.title')}
      onClose={onClose}
      className="mx-auto mt-[8dvh] mb-auto max-h-[84dvh] w-[38rem] max-w-[94vw] rounded-md border border-rule-strong bg-paper p-4 text-ink shadow-float backdrop:bg-[rgb(0_0_0/0.5)] open:flex open:flex-col"
    >
      <div className="flex items-end gap-3" data-own-undo>
        <label className="min-w-0 flex-1">
          <span className="mb-1 block text-sm text-mute">{t('finder.field')}</span>
          <input
            type="text"
            role="combobox"
            aria-expanded={shown.length > 0}
            aria-controls={listId}
            aria-autocomplete="list"
            aria-activedescendant={at >= 0 ? idAt(at) : undefined}
            autoComplete="off"
            spellCheck={false}
            className={INPUT}
            value={text}
            onChange={(event) => {
              setText(event.target.value);
              setMarked(0);
            }}
            onKeyDown={onKeyDown}
          />
        </label>
        <button type="button" className="control" onClick={close}>
          {t('shell.dismiss')}
        </button>
      </div>
      <div
        id={listId}
        role="listbox"
        aria-label={t('finder.title')}
        className="mt-3 min-h-0 flex-1 overflow-y-auto border-t border-rule"
      >
        {shown.map((entry, index) => (
          <Option
            key={entry.id}
            id={idAt(index)}
            entry={entry}
            isMarked={index === at}
            onMark={() => setMarked(index)}
            onChoose={() => choose(entry)}
          />
        ))}
      </div>
      <p role="status" className="mt-2 text-sm text-mute">
        {countWords()}
      </p>
    </dialog>
  );

  function countWords(): string {
    const count = found.length;
    if (count === 0) return t('finder.none');
    if (count > SHOWN) return t('finder.first', { shown: SHOWN, count });
    return t('finder.found', { count });
  }
}

interface OptionProps {
  readonly id: string;
  readonly entry: Entry;
  readonly isMarked: boolean;
  readonly onMark: () => void;
  readonly onChoose: () => void;
}

function Option({ id, entry, isMarked, onMark, onChoose }: OptionProps) {
  const { t } = useTranslation();
  return (
    // biome-ignore lint/a11y/useKeyWithClickEvents: the keys are those of the field, which keeps the focus
    <div
      id={id}
      role="option"
      tabIndex={-1}
      aria-selected={isMarked}
      onPointerMove={() => !isMarked && onMark()}
      onPointerDown={(event) => event.preventDefault()}
      onClick={onChoose}
      className="flex min-h-11 cursor-pointer items-center gap-3 border-l-4 border-transparent px-3 py-1.5 aria-selected:border-brass aria-selected:bg-brass-soft"
    >
      <span className="min-w-0 flex-1 break-words">{entry.name}</span>
      {entry.symbol && entry.symbol !== entry.name && (
        <code className="max-w-[40%] truncate font-sans text-sm text-mute max-sm:hidden">
          {entry.symbol}
        </code>
      )}
      <span className="shrink-0 text-sm text-mute">{t(`finder.kinds.${entry.kind}`)}</span>
    </div>
  );
}

/** Where a key takes the mark; past an end it comes round. Null where the key is the field's. */
function moved(key: string, at: number, count: number): number | null {
  if (count === 0) return null;
  switch (key) {
    case 'ArrowDown':
      return (at + 1) % count;
    case 'ArrowUp':
      return (at - 1 + count) % count;
    case 'PageDown':
      return Math.min(at + 8, count - 1);
    case 'PageUp':
      return Math.max(at - 8, 0);
    default:
      return null;
  }
}
