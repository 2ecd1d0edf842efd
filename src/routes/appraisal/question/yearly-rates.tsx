import { useTranslation } from 'react-i18next';
import { TextField } from '../../../components/form/text-field.tsx';
import { fromPercent, numberText, parseNumber, toPercent } from '../../../i18n/parse-number.ts';
import { type Language, useSettings } from '../../../store/settings.ts';

interface YearlyRatesProps {
  readonly rates: readonly number[];
  readonly label: string;
  readonly set: (rates: number[]) => void;
}

/** Percentages in the order of the years, such as "3; 3; 2.5". */
export function YearlyRates({ rates, label, set }: YearlyRatesProps) {
  const { t } = useTranslation();
  const { language } = useSettings();
  return (
    <TextField
      label={label}
      help={t('framing.ratesHelp')}
      required
      value={rates.map((rate) => numberText(toPercent(rate), language)).join('; ')}
      check={(text) => (readRates(text, language) ? null : t('framing.ratesUnread'))}
      onValue={(text) => {
        const read = readRates(text, language);
        if (read) set(read);
      }}
    />
  );
}

const MOST = 1_000;

function readRates(text: string, language: Language): number[] | null {
  const parts = text.split(';').filter((part) => part.trim() !== '');
  const rates = parts.map((part) => parseNumber(part, language));
  const sound = rates.filter((rate): rate is number => rate !== null && rate > -100);
  const isSound = sound.length === parts.length && sound.length > 0 && sound.length <= MOST;
  return isSound ? sound.map(fromPercent) : null;
}
