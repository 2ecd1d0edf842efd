/** A field with its name, what helps to fill it, and what is wrong with it beside it. */
import { type ReactNode, useId } from 'react';

export interface FieldParts {
  readonly id: string;
  readonly 'aria-describedby': string | undefined;
  readonly 'aria-invalid': true | undefined;
}

interface FieldProps {
  readonly label: string;
  /** The name is for assistive technology alone: the place says it to the eye. */
  readonly quiet?: boolean;
  readonly help?: string | undefined;
  /** What is wrong; null where nothing is. */
  readonly error?: string | null | undefined;
  readonly className?: string;
  readonly children: (parts: FieldParts) => ReactNode;
}

export const INPUT =
  'min-h-11 w-full min-w-0 rounded-md border border-rule-strong bg-raised px-2.5 py-1.5 text-ink aria-invalid:border-clay disabled:opacity-60';

export function Field({ label, quiet, help, error, className = '', children }: FieldProps) {
  const id = useId();
  const helpId = `${id}-help`;
  const errorId = `${id}-error`;
  const described = [help && helpId, error && errorId].filter(Boolean).join(' ') || undefined;
  return (
    <div className={`min-w-0 ${className}`}>
      <label htmlFor={id} className={quiet ? 'sr-only' : 'mb-1 block text-sm text-mute'}>
        {label}
      </label>
      {children({
        id,
        'aria-describedby': described,
        'aria-invalid': error ? true : undefined,
      })}
      {help && (
        <p id={helpId} className="mt-1 text-sm text-mute">
          {help}
        </p>
      )}
      {error && (
        <p id={errorId} className="mt-1 text-sm text-clay">
          {error}
        </p>
      )}
    </div>
  );
}
