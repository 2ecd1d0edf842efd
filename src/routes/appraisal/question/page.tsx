import type { TFunction } from 'i18next';
import type { ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import type { DiscountRate, ModelDocument } from '../../../../shared/model/document.ts';
import { usePageTitle } from '../../../components/page-title.ts';
import { Swatch } from '../../../components/strategy-mark.tsx';
import { formatMoney, formatNumber, formatPercent, formatValue } from '../../../i18n/format.ts';
import { outcomeWords } from '../../../i18n/outcome-words.ts';
import type { Language } from '../../../store/settings.ts';
import { useAppraisalContext } from '../context.ts';

/** The decision question, as the document frames it. */
export function Component() {
  const { t } = useTranslation();
  const { document, language } = useAppraisalContext();
  usePageTitle(t('steps.question'), document?.question.title ?? '');
  return (
    <>
      <h1 className="mt-7 max-w-[36em] text-2xl leading-tight">
        {document?.question.decision ?? t('steps.question')}
      </h1>
      {document ? <Question document={document} language={language} /> : <p>{t('broken.body')}</p>}
    </>
  );
}

interface PartProps {
  readonly document: ModelDocument;
  readonly language: Language;
}

function Question({ document, language }: PartProps) {
  const { t } = useTranslation();
  const { question, about } = document;
  const outcome = outcomeWords(question, t);
  const { code, symbol, priceYear } = question.currency;
  return (
    <>
      {about.summary && <p className="mt-3 max-w-[44em] text-mute">{about.summary}</p>}
      <dl className="mt-6 border-t border-ink">
        <Line term={t('question.population')}>{question.population}</Line>
        <Line term={t('question.strategies')}>
          <Strategies document={document} />
        </Line>
        <Line term={t('question.perspective')}>{question.perspective}</Line>
        <Line term={t('question.setting')}>{question.setting}</Line>
        <Line term={t('question.horizon')}>{years(question.horizon, t, language)}</Line>
        <Line term={t('question.cycle')}>{years(question.cycleLength, t, language)}</Line>
        <Line term={t('question.counting')}>{t(`question.countings.${question.counting}`)}</Line>
        <Line term={t('question.discounting')}>
          {t('question.rates', {
            costs: rate(question.discounting.costs, t, language),
            outcomes: rate(question.discounting.outcomes, t, language),
          })}
        </Line>
        <Line term={t('question.outcome')}>
          {t(`question.directions.${question.outcome.direction}`, { unit: outcome.plural })}
        </Line>
        <Line term={t('question.thresholds')}>
          <Thresholds document={document} language={language} />
        </Line>
        <Line term={t('question.currency')}>
          {t('question.prices', { symbol, code, year: priceYear })}
        </Line>
        {question.beneficiaries && (
          <Line term={t('question.beneficiaries')}>
            {question.beneficiaries.label}
            <span className="block text-sm text-mute">
              {t('question.persons', {
                incidence: formatNumber(question.beneficiaries.incidence, language),
                prevalent: formatNumber(question.beneficiaries.prevalent, language),
                years: formatValue(question.beneficiaries.years, language),
              })}
            </span>
          </Line>
        )}
        {question.referenceCase && (
          <Line term={t('question.referenceCase')}>
            {question.referenceCase.label}
            {question.referenceCase.source && (
              <span className="block text-sm text-mute">{question.referenceCase.source}</span>
            )}
          </Line>
        )}
        {about.limits && <Line term={t('question.limits')}>{about.limits}</Line>}
        {about.citation && <Line term={t('question.citation')}>{about.citation}</Line>}
      </dl>
    </>
  );
}

function Line({ term, children }: { term: string; children: ReactNode }) {
  return (
    <div className="border-b border-rule py-3 sm:grid sm:grid-cols-[14rem_1fr] sm:gap-x-6">
      <dt className="text-mute">{term}</dt>
      <dd className="max-w-[44em]">{children}</dd>
    </div>
  );
}

function Strategies({ document }: { document: ModelDocument }) {
  const { t } = useTranslation();
  return (
    <ul className="grid gap-2">
      {document.strategies.map(({ id, label, description }, index) => (
        <li key={id}>
          <span className="inline-flex flex-wrap items-center gap-x-2">
            <Swatch index={index} />
            <span className="font-bold">{label}</span>
            {id === document.question.comparator && (
              <span className="text-sm text-mute">{t('question.comparator')}</span>
            )}
          </span>
          {description && <span className="block text-sm text-mute">{description}</span>}
        </li>
      ))}
    </ul>
  );
}

function Thresholds({ document, language }: PartProps) {
  const { t } = useTranslation();
  const { question } = document;
  const { per } = outcomeWords(question, t);
  return (
    <ul className="grid gap-2">
      {question.thresholds.map(({ id, label, value, source }) => (
        <li key={id}>
          <span className="font-bold">
            {t('threshold', {
              amount: formatMoney(value, question.currency.symbol, language),
              unit: per,
            })}
          </span>{' '}
          {label}
          {source && <span className="block text-sm text-mute">{source}</span>}
        </li>
      ))}
    </ul>
  );
}

/** A length of time: months and weeks where the years are those. */
function years(value: number, t: TFunction, language: Language): string {
  const near = (other: number) => Math.abs(value - other) < 1e-6;
  if (near(1 / 12)) return t('question.months', { count: 1, value: '1' });
  if (near(1 / 4)) return t('question.months', { count: 3, value: '3' });
  if (near(1 / 2)) return t('question.months', { count: 6, value: '6' });
  if (near(7 / 365.25)) return t('question.weeks', { count: 1, value: '1' });
  return t('question.years', { count: value, value: formatValue(value, language) });
}

function rate(value: DiscountRate, t: TFunction, language: Language): string {
  if (typeof value === 'number') return formatPercent(value, language);
  const list = value.byYear.map((each) => formatPercent(each, language)).join(', ');
  return t('question.rateByYear', { list });
}
