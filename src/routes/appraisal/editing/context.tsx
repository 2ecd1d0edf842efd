/** What the editors of evidence and model share: the draft, what is wrong with it, and the way to change it. */
import { createContext, type ReactNode, useContext, useMemo, useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { ModelDocument } from '../../../../shared/model/document.ts';
import type { Edit, Json, Place } from '../../../../shared/model/edit/edit.ts';
import type { Issue, Path } from '../../../../shared/model/issue.ts';
import { type FormulaNames, formulaNames } from '../../../features/formula-field/formula-names.ts';
import { type Language, useSettings } from '../../../store/settings.ts';

interface EditingProps {
  readonly document: ModelDocument;
  readonly issues: readonly Issue[];
  readonly edit: (edits: readonly Edit[], label: string, group?: string) => void;
}

export interface Editing extends EditingProps {
  readonly names: FormulaNames;
  readonly language: Language;
  /** What is wrong at a place or below it. */
  readonly issuesAt: (path: Path) => readonly Issue[];
  /** Sets a field, or takes it away (undefined); typing on in one field is undone at once. */
  readonly change: (at: Place, value: Json | undefined, what: string) => void;
}

/** The same object as long as no name means anything else: formulas can change under it. */
function useSteadyNames(document: ModelDocument): FormulaNames {
  const { parameters, variables, tables, covariates } = document;
  const [kept, setKept] = useState(() => formulaNames(document));
  // biome-ignore lint/correctness/useExhaustiveDependencies: names are all that is read of it.
  const now = useMemo(() => formulaNames(document), [parameters, variables, tables, covariates]);
  if (now === kept || isSame(now, kept)) return kept;
  setKept(now);
  return now;
}

function isSame(a: FormulaNames, b: FormulaNames): boolean {
  const text = ({ list, scope }: FormulaNames) => JSON.stringify([list, [...scope.names.values()]]);
  return text(a) === text(b);
}

const EditingContext = createContext<Editing | null>(null);

export function EditingProvider(props: EditingProps & { readonly children: ReactNode }) {
  const { document, issues, edit, children } = props;
  const { t } = useTranslation();
  const { language } = useSettings();
  const names = useSteadyNames(document);
  const editing: Editing = {
    document,
    issues,
    edit,
    names,
    language,
    issuesAt: (path) => issues.filter((issue) => isWithin(issue.path, path)),
    change: (at, value, what) => {
      const label = t('editing.acts.changed', { what });
      const one: Edit = value === undefined ? { type: 'unset', at } : { type: 'set', at, value };
      edit([one], label, JSON.stringify(at));
    },
  };
  return <EditingContext value={editing}>{children}</EditingContext>;
}

export function useEditing(): Editing {
  const editing = useContext(EditingContext);
  if (!editing) throw new Error('nothing is edited here');
  return editing;
}

function isWithin(path: Path, place: Path): boolean {
  return place.every((key, depth) => path[depth] === key);
}
