import type { ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { useSession } from './session-context.ts';

/** One step back, one step forth; each names the step that it takes. */
export function UndoButtons() {
  const { t } = useTranslation();
  const { state, undo, redo, readOnly } = useSession();
  const undoName = state.undo ? t('shell.undoWhat', { what: state.undo.label }) : t('shell.undo');
  const redoName = state.redo ? t('shell.redoWhat', { what: state.redo.label }) : t('shell.redo');
  return (
    <span className="flex">
      <Step name={undoName} act={undo} off={!state.undo || readOnly}>
        <path d="M8 3 L3 8 L8 13 M3 8 H12 Q17 8 17 13 V16" />
      </Step>
      <Step name={redoName} act={redo} off={!state.redo || readOnly}>
        <path d="M12 3 L17 8 L12 13 M17 8 H8 Q3 8 3 13 V16" />
      </Step>
    </span>
  );
}

interface StepProps {
  readonly name: string;
  readonly act: () => void;
  readonly off: boolean;
  readonly children: ReactNode;
}

/** Stays focusable when there is nothing left to do, so that the focus is not lost. */
function Step({ name, act, off, children }: StepProps) {
  return (
    <button
      type="button"
      aria-label={name}
      title={name}
      aria-disabled={off}
      onClick={() => !off && act()}
      className="grid size-11 place-items-center rounded-md text-ink hover:bg-brass-soft aria-disabled:text-rule-strong aria-disabled:hover:bg-transparent"
    >
      <svg
        width="20"
        height="18"
        viewBox="0 0 20 18"
        fill="none"
        stroke="currentColor"
        strokeWidth="2"
        aria-hidden="true"
      >
        {children}
      </svg>
    </button>
  );
}
