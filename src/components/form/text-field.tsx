import { useTranslation } from 'react-i18next';
import { Field, INPUT } from './field.tsx';
import { useDraft } from './use-draft.ts';

interface TextFieldProps {
  readonly label: string;
  readonly quiet?: boolean;
  readonly help?: string;
  readonly value: string;
  readonly onValue: (value: string) => void;
  /** An empty text is no answer here. */
  readonly required?: boolean;
  readonly maxLength?: number;
  /** What else makes a text unfit, in words; null where it is fit. */
  readonly check?: (text: string) => string | null;
  /** Lines to begin with; one line without. */
  readonly lines?: number;
  readonly autoFocus?: boolean;
  readonly disabled?: boolean;
  readonly className?: string;
}

export function TextField(props: TextFieldProps) {
  const { t } = useTranslation();
  const { label, quiet, help, value, onValue, required, maxLength, check, lines, className } =
    props;
  const problem = (text: string) => {
    if (required && text.trim() === '') return t('form.required');
    return text === '' ? null : (check?.(text) ?? null);
  };
  const field = useDraft({
    value,
    format: (text) => text,
    parse: (text) => (problem(text) === null ? { value: text } : null),
    commit: onValue,
  });
  const common = {
    className: INPUT,
    value: field.text,
    maxLength,
    disabled: props.disabled,
    autoFocus: props.autoFocus,
    onBlur: field.leave,
    onKeyDown: field.undo,
  };
  return (
    <Field
      label={label}
      {...(quiet ? { quiet } : {})}
      help={help}
      error={problem(field.text)}
      {...(className ? { className } : {})}
    >
      {(parts) =>
        lines ? (
          <textarea
            {...parts}
            {...common}
            className={`${INPUT} field-sizing-content`}
            rows={lines}
            onChange={(event) => field.change(event.target.value)}
          />
        ) : (
          <input
            {...parts}
            {...common}
            type="text"
            autoComplete="off"
            onChange={(event) => field.change(event.target.value)}
          />
        )
      }
    </Field>
  );
}
