import { useTranslation } from 'react-i18next';
import { useEditing } from './context.tsx';

interface StrategiesChosenProps {
  readonly legend: string;
  /** Undefined for all. */
  readonly value: readonly string[] | undefined;
  readonly onValue: (strategies: string[] | undefined) => void;
}

/** Which strategies something holds for: all of them, or those ticked. */
export function StrategiesChosen({ legend, value, onValue }: StrategiesChosenProps) {
  const { t } = useTranslation();
  const { document } = useEditing();
  const all = document.strategies.map(({ id }) => id);
  const chosen = value ?? all;
  const turn = (id: string) => {
    const next = all.filter((each) => chosen.includes(each) !== (each === id));
    // It holds for somebody: the last tick stays.
    if (next.length > 0) onValue(next.length === all.length ? undefined : next);
  };
  return (
    <fieldset className="min-w-0">
      <legend className="mb-1 text-sm text-mute">{legend}</legend>
      <div className="flex flex-wrap gap-x-4">
        {document.strategies.map(({ id, label }) => (
          <label key={id} className="flex min-h-10 items-center gap-2">
            <input
              type="checkbox"
              checked={chosen.includes(id)}
              disabled={chosen.length === 1 && chosen[0] === id}
              onChange={() => turn(id)}
              className="size-4 accent-brass"
            />
            {label}
          </label>
        ))}
      </div>
      {value === undefined && <p className="text-sm text-mute">{t('editing.allStrategies')}</p>}
    </fieldset>
  );
}
