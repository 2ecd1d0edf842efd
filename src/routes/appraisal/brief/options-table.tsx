import { useTranslation } from 'react-i18next';
import type { Brief } from '../../../../shared/export/brief/draft.ts';
import type { BriefOption } from '../../../../shared/export/brief/options-table.ts';
import { Figure } from '../../../components/figure.tsx';
import { type BriefReader, frequencyWords } from '../../../i18n/brief-words.ts';
import { formatAmount, formatOutcome } from '../../../i18n/format.ts';

interface OptionsTableProps {
  readonly brief: Brief;
  readonly reader: BriefReader;
}

/** In order of cost; on a phone each option is a card. */
export function OptionsTable({ brief, reader }: OptionsTableProps) {
  const { t } = useTranslation();
  const { symbol, outcome } = reader;
  const heads = [
    t('brief.table.cost', { symbol }),
    outcome.plural,
    t('brief.table.icer', { symbol }),
    t('brief.table.best'),
  ];
  return (
    <table className="sheet-table">
      <caption>{t('brief.parts.options')}</caption>
      <thead>
        <tr>
          {[t('brief.table.option'), ...heads].map((head) => (
            <th key={head} scope="col">
              {head}
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {brief.options.map((option) => (
          <OptionRow key={option.id} option={option} heads={heads} reader={reader} />
        ))}
      </tbody>
    </table>
  );
}

interface OptionRowProps {
  readonly option: BriefOption;
  readonly heads: readonly string[];
  readonly reader: BriefReader;
}

function OptionRow({ option, heads, reader }: OptionRowProps) {
  const { t } = useTranslation();
  const { language } = reader;
  const { id, label, cost, outcome, best, isBest, isComparator } = option;
  return (
    <tr data-strategy={id} className={isBest ? 'font-bold' : ''}>
      <th scope="row">
        {label}
        {isComparator && (
          <span className="font-normal text-mute"> ({t('brief.table.comparator')})</span>
        )}
      </th>
      <td data-head={heads[0]}>
        <Figure name="cost" value={cost}>
          {formatAmount(cost, language)}
        </Figure>
      </td>
      <td data-head={heads[1]}>
        <Figure name="outcome" value={outcome}>
          {formatOutcome(outcome, language)}
        </Figure>
      </td>
      <td data-head={heads[2]}>
        <Ratio option={option} reader={reader} />
      </td>
      <td data-head={heads[3]}>
        {best ? (
          <Figure name="best" value={best.count}>
            {frequencyWords(best, reader)}
          </Figure>
        ) : (
          t('strip.noNumber')
        )}
      </td>
    </tr>
  );
}

function Ratio({ option, reader }: { option: BriefOption; reader: BriefReader }) {
  const { t } = useTranslation();
  const { icer, noIcer, because } = option;
  if (icer !== null) {
    return (
      <Figure name="icer" value={icer}>
        {formatAmount(icer, reader.language)}
      </Figure>
    );
  }
  const words = because.join(t('brief.value.and'));
  return (
    <span className="font-normal text-mute">
      {t(`brief.table.noIcer.${noIcer ?? 'reference'}`, { because: words })}
    </span>
  );
}
