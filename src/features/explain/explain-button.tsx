import { useTranslation } from 'react-i18next';
import type { Subject } from './subject.ts';
import { useExplain } from './use-explain.ts';

interface ExplainButtonProps {
  readonly subject: Subject;
  /** What it is called, for those who hear the button alone. */
  readonly of: string;
}

/** Opens the panel on a subject; absent where there is nothing to open. */
export function ExplainButton({ subject, of }: ExplainButtonProps) {
  const { t } = useTranslation();
  const explain = useExplain();
  if (!explain) return null;
  return (
    <button
      type="button"
      aria-label={t('explain.openNamed', { what: of })}
      className="min-h-9 text-sm underline decoration-rule-strong underline-offset-4"
      onClick={() => explain(subject)}
    >
      {t('explain.open')}
    </button>
  );
}
