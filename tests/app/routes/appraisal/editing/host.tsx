/** An editor of the model with a document to edit, and nothing else around it. */
import { fireEvent, render, screen } from '@testing-library/react';
import { type ReactNode, useRef, useState } from 'react';
import { MemoryRouter } from 'react-router-dom';
import { checkFormulas } from '../../../../../shared/formula/check.ts';
import type { ModelDocument } from '../../../../../shared/model/document.ts';
import { applyEdits } from '../../../../../shared/model/edit/apply.ts';
import type { Edit } from '../../../../../shared/model/edit/edit.ts';
import { EditingProvider } from '../../../../../src/routes/appraisal/editing/context.tsx';

interface Hosted {
  /** The document as it stands. */
  readonly document: () => ModelDocument;
  /** What was done, in the words that undo shows. */
  readonly acts: string[];
}

interface HostProps {
  readonly first: ModelDocument;
  readonly onEdit: (document: ModelDocument, label: string) => void;
  readonly children: ReactNode;
}

function Host({ first, onEdit, children }: HostProps) {
  const [document, setDocument] = useState(first);
  const latest = useRef(first);
  const edit = (edits: readonly Edit[], label: string) => {
    latest.current = applyEdits(latest.current, edits).document;
    onEdit(latest.current, label);
    setDocument(latest.current);
  };
  return (
    <EditingProvider document={document} issues={checkFormulas(document)} edit={edit}>
      {children}
    </EditingProvider>
  );
}

export function host(first: ModelDocument, children: ReactNode): Hosted {
  let current = first;
  const acts: string[] = [];
  const onEdit = (document: ModelDocument, label: string) => {
    current = document;
    acts.push(label);
  };
  render(
    <MemoryRouter>
      <Host first={first} onEdit={onEdit}>
        {children}
      </Host>
    </MemoryRouter>,
  );
  return { document: () => current, acts };
}

export function fill(label: string | RegExp, value: string, index = 0): void {
  const field = screen.getAllByLabelText(label)[index];
  if (!field) throw new Error(`no field ${label}`);
  fireEvent.change(field, { target: { value } });
}

export function press(name: string | RegExp, index = 0): void {
  const button = screen.getAllByRole('button', { name })[index];
  if (!button) throw new Error(`no button ${name}`);
  fireEvent.click(button);
}
