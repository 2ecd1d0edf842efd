import { useTranslation } from 'react-i18next';
import { KINDS, type Kind } from '../../../../shared/model/kinds.ts';
import { SelectField } from '../../../components/form/select-field.tsx';

interface KindSelectProps {
  readonly value: Kind | undefined;
  readonly onValue: (kind: Kind | undefined) => void;
  /** Whether it may be left to the formula to say. */
  readonly optional?: boolean;
}

export function KindSelect({ value, onValue, optional = false }: KindSelectProps) {
  const { t } = useTranslation();
  const none = { value: '' as const, name: t('editing.kindOpen') };
  return (
    <SelectField<Kind | ''>
      label={t('editing.kind')}
      value={value ?? ''}
      options={[
        ...(optional ? [none] : []),
        ...KINDS.map((kind) => ({ value: kind, name: t(`kinds.${kind}`) })),
      ]}
      onValue={(kind) => onValue(kind === '' ? undefined : kind)}
    />
  );
}
