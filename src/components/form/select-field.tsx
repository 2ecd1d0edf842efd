import { Field, INPUT } from './field.tsx';

interface SelectFieldProps<T extends string> {
  readonly label: string;
  readonly quiet?: boolean;
  readonly help?: string;
  readonly value: T;
  readonly options: readonly { readonly value: T; readonly name: string }[];
  readonly onValue: (value: T) => void;
  readonly disabled?: boolean;
  readonly className?: string;
}

export function SelectField<T extends string>(props: SelectFieldProps<T>) {
  const { label, quiet, help, value, options, onValue, disabled, className } = props;
  return (
    <Field
      label={label}
      {...(quiet ? { quiet } : {})}
      help={help}
      {...(className ? { className } : {})}
    >
      {(parts) => (
        <select
          {...parts}
          className={INPUT}
          value={value}
          disabled={disabled}
          onChange={(event) => onValue(event.target.value as T)}
        >
          {options.map((option) => (
            <option key={option.value} value={option.value}>
              {option.name}
            </option>
          ))}
        </select>
      )}
    </Field>
  );
}
