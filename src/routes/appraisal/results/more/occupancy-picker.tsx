/** Chooses a point of the trace to be taken apart. */
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { ModelDocument } from '../../../../../shared/model/document.ts';

interface OccupancyPickerProps {
  readonly document: ModelDocument;
  readonly cycles: number;
  readonly onPick: (state: string, cycle: number) => void;
}

const FIELD = 'min-h-9 rounded-md border border-rule-strong bg-raised px-2 text-ink';

export function OccupancyPicker({ document, cycles, onPick }: OccupancyPickerProps) {
  const { t } = useTranslation();
  const [state, setState] = useState(document.states[0]?.id ?? '');
  const [cycle, setCycle] = useState(1);
  return (
    <span className="mt-1 flex flex-wrap items-end gap-2 print:hidden">
      <label>
        <span className="mr-1">{t('explain.state')}</span>
        <select
          className={`${FIELD} max-w-44`}
          value={state}
          onChange={(event) => setState(event.target.value)}
        >
          {document.states.map(({ id, label }) => (
            <option key={id} value={id}>
              {label}
            </option>
          ))}
        </select>
      </label>
      <label>
        <span className="mr-1">{t('more.trace.cycle')}</span>
        <input
          className={`${FIELD} w-20`}
          type="number"
          min={0}
          max={cycles}
          value={cycle}
          onChange={(event) => setCycle(Number(event.target.value))}
        />
      </label>
      <button
        type="button"
        className="control min-h-9 px-3 text-sm"
        onClick={() => onPick(state, Math.min(cycles, Math.max(0, Math.round(cycle))))}
      >
        {t('explain.open')}
      </button>
    </span>
  );
}
