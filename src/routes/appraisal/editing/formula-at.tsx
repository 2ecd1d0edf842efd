/** Formulas of the document, each at its place. */
import { memo } from 'react';
import { useTranslation } from 'react-i18next';
import type { StrategyFormula } from '../../../../shared/model/document.ts';
import type { Json, Place } from '../../../../shared/model/edit/edit.ts';
import type { Path } from '../../../../shared/model/issue.ts';
import { formulaFor } from '../../../../shared/model/strategy-formula.ts';
import { FormulaField } from '../../../features/formula-field/formula-field.tsx';
import { useEditing } from './context.tsx';
import { IssueLines } from './issue-lines.tsx';

/**
 * Keystrokes come back as a new document: fields that it says nothing new to are left alone.
 * A field is made anew where its place is another, so what it does on change never differs.
 */
const SteadyField = memo(FormulaField, (before, after) => {
  const { label, quiet, value, names, issues, document } = after;
  return (
    before.label === label &&
    before.quiet === quiet &&
    before.value === value &&
    before.names === names &&
    (issues.length === 0
      ? before.issues.length === 0
      : before.document === document && before.issues === issues)
  );
});

interface TextAtProps {
  readonly label: string;
  readonly quiet?: boolean;
  readonly text: string;
  readonly at: Place;
  /** The same place by positions, as issues give it. */
  readonly path: Path;
  /** What the formula is of, for undo. */
  readonly what: string;
}

function TextAt({ label, quiet = false, text, at, path, what }: TextAtProps) {
  const { document, names, issuesAt, change } = useEditing();
  return (
    <SteadyField
      key={JSON.stringify(at)}
      label={label}
      quiet={quiet}
      value={text}
      names={names}
      document={document}
      issues={issuesAt(path)}
      onChange={(typed) => change(at, typed, what)}
    />
  );
}

interface FormulaAtProps {
  readonly label: string;
  readonly quiet?: boolean;
  readonly formula: StrategyFormula;
  readonly at: Place;
  readonly path: Path;
  readonly what: string;
  /** Strategies that it holds for; all of the document where absent. */
  readonly strategies?: readonly string[] | undefined;
}

/** One formula for all strategies, or one each; the writer says which. */
export function FormulaAt(props: FormulaAtProps) {
  const { label, quiet, formula, at, path, what, strategies } = props;
  const { document, issuesAt } = useEditing();
  const held = document.strategies.filter(({ id }) => strategies?.includes(id) ?? true);
  const canDiffer = held.length > 1;
  if (typeof formula === 'string') {
    return (
      <div className="min-w-0">
        <TextAt {...props} text={formula} />
        {canDiffer && <Differs {...props} ids={held.map(({ id }) => id)} />}
      </div>
    );
  }
  const { byStrategy, otherwise } = formula;
  const rest = held.filter(({ id }) => !Object.hasOwn(byStrategy, id));
  return (
    <fieldset className="grid min-w-0 gap-2">
      <legend className={quiet ? 'sr-only' : 'mb-1 text-sm text-mute'}>{label}</legend>
      {held.map(({ id, label: strategy }) => {
        const text = byStrategy[id];
        if (text === undefined && otherwise !== undefined) return null;
        return (
          <TextAt
            key={id}
            label={strategy}
            text={text ?? ''}
            at={[...at, 'byStrategy', id]}
            path={[...path, 'byStrategy', id]}
            what={what}
          />
        );
      })}
      {otherwise !== undefined && rest.length > 0 && (
        <TextAt
          label={rest.map((strategy) => strategy.label).join(', ')}
          text={otherwise}
          at={[...at, 'otherwise']}
          path={[...path, 'otherwise']}
          what={what}
        />
      )}
      <IssueLines issues={issuesAt(path).filter((issue) => issue.path.length === path.length)} />
      <Differs {...props} ids={held.map(({ id }) => id)} />
    </fieldset>
  );
}

/** Turns one formula into one a strategy, each beginning as the one there was, and back. */
function Differs(props: FormulaAtProps & { readonly ids: readonly string[] }) {
  const { t } = useTranslation();
  const { change } = useEditing();
  const { formula, at, what, ids } = props;
  const isOne = typeof formula === 'string';
  const turn = () => {
    const texts = ids.map((id) => [id, formulaFor(formula, id) ?? '0'] as const);
    const value = isOne ? { byStrategy: Object.fromEntries(texts) } : (texts[0]?.[1] ?? '0');
    change(at, value as Json, what);
  };
  return (
    <label className="mt-0.5 flex min-h-8 items-center gap-2 text-sm text-mute">
      <input type="checkbox" checked={!isOne} onChange={turn} className="size-4 accent-brass" />
      {t('editing.differs')}
    </label>
  );
}

/** The text that holds for one strategy. */
export function FormulaFor(props: FormulaAtProps & { readonly strategy: string }) {
  const { formula, at, path, strategy } = props;
  if (typeof formula === 'string') return <FormulaAt {...props} />;
  const key = Object.hasOwn(formula.byStrategy, strategy)
    ? ['byStrategy', strategy]
    : formula.otherwise !== undefined
      ? ['otherwise']
      : ['byStrategy', strategy];
  return (
    <TextAt
      {...props}
      text={formulaFor(formula, strategy) ?? ''}
      at={[...at, ...key]}
      path={[...path, ...key]}
    />
  );
}
