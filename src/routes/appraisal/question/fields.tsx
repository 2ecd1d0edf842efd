/** Fields of the question that write where they read, one edit for what is typed in a go. */
import type { Json, Place } from '../../../../shared/model/edit/edit.ts';
import { NumberField, type NumberLimits } from '../../../components/form/number-field.tsx';
import { SelectField } from '../../../components/form/select-field.tsx';
import { TextField } from '../../../components/form/text-field.tsx';
import { useEditing } from '../editing/context.tsx';

interface AtProps {
  readonly at: Place;
  readonly label: string;
  readonly quiet?: boolean;
  readonly help?: string;
  readonly className?: string;
}

interface TextAtProps extends AtProps {
  readonly value: string | undefined;
  readonly lines?: number;
  readonly required?: boolean;
  /** An empty text takes the field out of the document. */
  readonly optional?: boolean;
  readonly maxLength?: number;
  readonly check?: (text: string) => string | null;
  readonly autoFocus?: boolean;
}

export function TextAt({ at, value, optional, ...field }: TextAtProps) {
  const { change } = useEditing();
  return (
    <TextField
      maxLength={20_000}
      {...field}
      value={value ?? ''}
      onValue={(text) => change(at, optional && text === '' ? undefined : text, field.label)}
    />
  );
}

/** A name: it must not be empty, nor longer than a line or two. */
export function LabelAt(props: Omit<TextAtProps, 'required' | 'maxLength'>) {
  return <TextAt {...props} required maxLength={300} />;
}

interface NumberAtProps extends AtProps, NumberLimits {
  readonly value: number;
  readonly percent?: boolean;
  readonly unit?: string;
}

export function NumberAt({ at, ...field }: NumberAtProps) {
  const { change } = useEditing();
  return <NumberField {...field} onValue={(value) => change(at, value, field.label)} />;
}

interface SelectAtProps<T extends string> extends AtProps {
  readonly value: T;
  readonly options: readonly { readonly value: T; readonly name: string }[];
}

export function SelectAt<T extends string>({ at, ...field }: SelectAtProps<T>) {
  const { change } = useEditing();
  return <SelectField {...field} onValue={(value) => change(at, value as Json, field.label)} />;
}
