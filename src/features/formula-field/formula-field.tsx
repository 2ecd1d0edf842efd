/**
 * A field for a formula: completes names and functions, colours kinds, and shows what is
 * wrong at its place. The text is drawn behind the field's own, which is transparent, so
 * that selection, caret and input methods are the browser's.
 */
import {
  type KeyboardEvent,
  type RefObject,
  useDeferredValue,
  useId,
  useLayoutEffect,
  useMemo,
  useRef,
  useState,
} from 'react';
import { useTranslation } from 'react-i18next';
import type { ModelDocument } from '../../../shared/model/document.ts';
import type { Issue } from '../../../shared/model/issue.ts';
import { issueWords } from '../../i18n/issue-words.ts';
import { useSettings } from '../../store/settings.ts';
import { argumentAt } from './argument-at.ts';
import { Coloured, type MarkedSpan } from './coloured.tsx';
import { type Completions, completed, completionsAt } from './complete.ts';
import type { FormulaNames, KnownName } from './formula-names.ts';
import { optionId, Suggestions } from './suggestions.tsx';
import { textIssues } from './text-issues.ts';
import { tokensOf } from './tokens.ts';
import { useTextDraft } from './use-text-draft.ts';

interface FormulaFieldProps {
  /** What the field is of; shown above it unless `quiet`. */
  readonly label: string;
  readonly quiet?: boolean;
  readonly value: string;
  readonly names: FormulaNames;
  readonly document: ModelDocument;
  /** What the check of the document says of this formula. */
  readonly issues: readonly Issue[];
  readonly onChange: (text: string) => void;
}

const TEXT = 'px-2.5 py-2 text-base leading-6 whitespace-pre-wrap [overflow-wrap:anywhere]';

export function FormulaField(props: FormulaFieldProps) {
  const { label, quiet = false, value, names, document, issues, onChange } = props;
  const id = useId();
  const area = useRef<HTMLTextAreaElement>(null);
  const [text, type] = useTextDraft(value, onChange);
  const completion = useCompletion(area, text, type, names);
  const shown = useShownIssues(text, value, names, issues);
  const marks = shown.flatMap(({ at, severity }): MarkedSpan[] =>
    at ? [{ ...at, severity }] : [],
  );
  const tokens = useMemo(() => tokensOf(text, names), [text, names]);
  const list = `${id}-list`;
  const { open, active } = completion;
  const isWrong = shown.some(({ severity }) => severity === 'error');
  return (
    <div className="min-w-0">
      <label htmlFor={id} className={quiet ? 'sr-only' : 'mb-1 block text-sm text-mute'}>
        {label}
      </label>
      <div
        className={`relative rounded-md border bg-raised focus-within:border-brass ${isWrong ? 'border-clay' : 'border-rule-strong'}`}
      >
        <div aria-hidden="true" className={`pointer-events-none min-h-[42px] ${TEXT}`}>
          <Coloured tokens={tokens} marks={marks} />
          {/* A line that ends the text has height only where something follows. */}
          {'\u200B'}
        </div>
        <textarea
          ref={area}
          id={id}
          value={text}
          rows={1}
          spellCheck={false}
          autoCapitalize="off"
          autoComplete="off"
          aria-autocomplete="list"
          aria-haspopup="listbox"
          aria-controls={open ? list : undefined}
          aria-activedescendant={open ? optionId(list, active) : undefined}
          aria-invalid={isWrong}
          aria-describedby={shown.length > 0 ? `${id}-issues` : undefined}
          onChange={(event) => completion.onType(event.target.value)}
          onKeyDown={completion.onKeyDown}
          onSelect={completion.onMove}
          onBlur={completion.close}
          className={`absolute inset-0 size-full resize-none overflow-hidden rounded-md bg-transparent text-transparent caret-ink ${TEXT}`}
        />
      </div>
      {open && (
        <Suggestions
          id={list}
          options={open.options}
          active={active}
          anchor={area}
          onChoose={completion.choose}
        />
      )}
      <Hint names={names} place={completion.place} />
      <SuggestionCount count={open?.options.length ?? 0} />
      <FormulaIssues id={`${id}-issues`} issues={shown} document={document} />
    </div>
  );
}

/** Never in the keystroke's own time: the text first, then what is wrong with it. */
function useShownIssues(
  text: string,
  value: string,
  names: FormulaNames,
  issues: readonly Issue[],
): readonly Issue[] {
  const deferred = useDeferredValue(text);
  const own = useMemo(() => textIssues(deferred, names), [deferred, names]);
  if (deferred !== text) return [];
  return own.length > 0 || text !== value ? own : issues;
}

interface Open extends Completions {
  readonly active: number;
}

function useCompletion(
  area: RefObject<HTMLTextAreaElement | null>,
  text: string,
  type: (text: string) => void,
  names: FormulaNames,
) {
  const [open, setOpen] = useState<Open | null>(null);
  const [caret, setCaret] = useState<number | null>(null);
  const wanted = useRef<number | null>(null);
  // biome-ignore lint/correctness/useExhaustiveDependencies: the caret is put right once the text is there.
  useLayoutEffect(() => {
    if (wanted.current === null) return;
    area.current?.setSelectionRange(wanted.current, wanted.current);
    wanted.current = null;
  }, [text]);
  const offer = (now: string, isAsked = false) => {
    const at = area.current?.selectionStart ?? now.length;
    const found = completionsAt(now, at, names, isAsked);
    setOpen(found && { ...found, active: 0 });
  };
  const close = () => setOpen(null);
  const choose = (name: KnownName) => {
    if (!open) return;
    const next = completed(text, open, name);
    wanted.current = next.caret;
    type(next.text);
    setCaret(next.caret);
    close();
    area.current?.focus();
  };
  const step = (by: number) => {
    if (!open) return;
    const count = open.options.length;
    setOpen({ ...open, active: (open.active + by + count) % count });
  };
  const onKeyDown = (event: KeyboardEvent) => {
    if (event.key === ' ' && event.ctrlKey) {
      event.preventDefault();
      return offer(text, true);
    }
    const chosen = open?.options[open.active];
    if (!open || !chosen || event.nativeEvent.isComposing) return;
    if (event.key === 'ArrowDown') step(1);
    else if (event.key === 'ArrowUp') step(-1);
    else if (event.key === 'Enter') choose(chosen);
    else if (event.key === 'Escape') close();
    else return;
    event.preventDefault();
    event.stopPropagation();
  };
  return {
    open,
    active: open?.active ?? 0,
    place: caret === null ? null : argumentAt(text, caret),
    choose,
    onKeyDown,
    onType: (now: string) => {
      type(now);
      offer(now);
    },
    onMove: () => {
      const at = area.current?.selectionStart ?? null;
      setCaret(at);
      // The caret went elsewhere: what was offered is for another word.
      if (open && at !== null && (at < open.from || at > open.to + 1)) close();
    },
    close: () => {
      setCaret(null);
      close();
    },
  };
}

/** The arguments of the function that the caret is in, the present one in bold. */
function Hint(props: {
  readonly names: FormulaNames;
  readonly place: { readonly fn: string; readonly index: number } | null;
}) {
  const { names, place } = props;
  const params = place ? names.bySymbol.get(place.fn)?.params : undefined;
  if (!place || !params) return null;
  const at = Math.min(place.index, params.length - 1);
  return (
    <p className="mt-1 text-sm break-words text-mute">
      {place.fn}(
      {params.map((param, index) => (
        // biome-ignore lint/suspicious/noArrayIndexKey: arguments can share a name, not a place.
        <span key={index} className={index === at ? 'font-bold text-ink' : ''}>
          {index > 0 && ', '}
          {param}
        </span>
      ))}
      )
    </p>
  );
}

/** Told to those who do not see the list. */
function SuggestionCount({ count }: { count: number }) {
  const { t } = useTranslation();
  return (
    <span role="status" className="sr-only">
      {count > 0 && t('formulaField.count', { count })}
    </span>
  );
}

interface FormulaIssuesProps {
  readonly id: string;
  readonly issues: readonly Issue[];
  readonly document: ModelDocument;
}

const MOST = 3;

function FormulaIssues({ id, issues, document }: FormulaIssuesProps) {
  const { t } = useTranslation();
  const { language } = useSettings();
  if (issues.length === 0) return null;
  return (
    <ul id={id} className="mt-1 grid gap-1 text-sm">
      {issues.slice(0, MOST).map((issue) => (
        <li
          key={`${issue.code} ${issue.at?.start} ${JSON.stringify(issue.params)}`}
          className={issue.severity === 'error' ? 'text-clay' : 'text-brass'}
        >
          {issueWords(issue, { t, language, document })}
        </li>
      ))}
    </ul>
  );
}
