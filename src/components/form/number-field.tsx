import { useTranslation } from 'react-i18next';
import { formatValue } from '../../i18n/format.ts';
import { fromPercent, numberText, parseNumber, toPercent } from '../../i18n/parse-number.ts';
import { useSettings } from '../../store/settings.ts';
import { Field, INPUT } from './field.tsx';
import { useDraft } from './use-draft.ts';

export interface NumberLimits {
  readonly min?: number;
  readonly max?: number;
  /** The value must be above it. */
  readonly above?: number;
  readonly whole?: boolean;
}

interface NumberFieldProps extends NumberLimits {
  readonly label: string;
  readonly quiet?: boolean;
  readonly help?: string;
  readonly value: number;
  readonly onValue: (value: number) => void;
  /** Typed and shown in hundredths; limits and value are shares. */
  readonly percent?: boolean;
  /** Stands after the number. */
  readonly unit?: string;
  readonly autoFocus?: boolean;
  readonly disabled?: boolean;
  readonly className?: string;
}

/** A number in the reader's own writing; what is out of bounds is said and not kept. */
export function NumberField(props: NumberFieldProps) {
  const { t } = useTranslation();
  const { language } = useSettings();
  const { label, quiet, help, value, onValue, percent, unit, className } = props;
  const shown = (number: number) => (percent ? toPercent(number) : number);
  const read = (text: string) => {
    const number = parseNumber(text, language);
    return number === null ? null : percent ? fromPercent(number) : number;
  };
  const problem = (text: string): string | null => {
    const number = read(text);
    if (number === null) return t(text.trim() === '' ? 'form.required' : 'form.noNumber');
    const broken = brokenLimit(number, props);
    if (!broken) return null;
    return t(`form.${broken.limit}`, { limit: formatValue(shown(broken.at), language) });
  };
  const field = useDraft({
    value,
    format: (number) => numberText(shown(number), language),
    parse: (text) => {
      const number = read(text);
      return number === null || brokenLimit(number, props) ? null : { value: number };
    },
    commit: onValue,
  });
  return (
    <Field
      label={label}
      {...(quiet ? { quiet } : {})}
      help={help}
      error={field.isSound ? null : problem(field.text)}
      {...(className ? { className } : {})}
    >
      {(parts) => (
        <span className="flex items-center gap-2">
          <input
            {...parts}
            type="text"
            inputMode="decimal"
            autoComplete="off"
            className={`${INPUT} max-w-40 text-right`}
            value={field.text}
            disabled={props.disabled}
            // biome-ignore lint/a11y/noAutofocus: only where the reader has just asked for the field
            autoFocus={props.autoFocus}
            onChange={(event) => field.change(event.target.value)}
            onBlur={field.leave}
            onKeyDown={field.undo}
          />
          {unit && <span className="text-mute">{unit}</span>}
        </span>
      )}
    </Field>
  );
}

interface Broken {
  readonly limit: 'min' | 'max' | 'above' | 'whole';
  readonly at: number;
}

function brokenLimit(value: number, { min, max, above, whole }: NumberLimits): Broken | null {
  if (whole && !Number.isInteger(value)) return { limit: 'whole', at: value };
  if (min !== undefined && value < min) return { limit: 'min', at: min };
  if (max !== undefined && value > max) return { limit: 'max', at: max };
  if (above !== undefined && value <= above) return { limit: 'above', at: above };
  return null;
}
