import { useTranslation } from 'react-i18next';

const ACTS = ['undo', 'redo', 'find', 'keys', 'poise', 'poiseFar', 'close'] as const;

/** Every key that does something of its own, and what it does. */
export function KeysList() {
  const { t } = useTranslation();
  return (
    <dl className="grid">
      {ACTS.map((act) => (
        <div
          key={act}
          className="border-b border-rule py-2 sm:grid sm:grid-cols-[15rem_1fr] sm:gap-x-6"
        >
          <dt className="font-bold">{t(`keys.${act}.keys`)}</dt>
          <dd>{t(`keys.${act}.does`)}</dd>
        </div>
      ))}
    </dl>
  );
}
