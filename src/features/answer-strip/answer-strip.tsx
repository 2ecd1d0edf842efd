/**
 * The answer at the threshold in force, on top of every step: which strategy is best, what
 * it is worth, how sure that is, and what knowing more would be worth.
 */
import type { ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { Figure } from '../../components/figure.tsx';
import { Steady } from '../../components/steady.tsx';
import {
  formatLargeMoney,
  formatMoney,
  formatNumber,
  formatProbability,
} from '../../i18n/format.ts';
import type { Answer, Chances, Estimate } from '../../store/answer.ts';
import type { DrawsRun } from '../../store/draws.ts';
import type { Language } from '../../store/settings.ts';
import { Pending } from './pending.tsx';

export interface AnswerStripProps {
  readonly now: Answer;
  /** The answer before the last movement of the poise; null where nothing has moved. */
  readonly was: Answer | null;
  /** Strategies' names by id. */
  readonly names: ReadonlyMap<string, string>;
  readonly comparator: string;
  /** The threshold in words, such as "KM 1,500 per QALY". */
  readonly threshold: string;
  readonly symbol: string;
  /** Whom the value for the population is for; absent where the question does not say. */
  readonly beneficiaries: string | undefined;
  readonly run: DrawsRun;
  readonly language: Language;
}

export function AnswerStrip(props: AnswerStripProps) {
  const { t } = useTranslation();
  return (
    <section
      aria-label={t('strip.label')}
      className="grid grid-cols-2 border-b border-rule md:grid-cols-[1.5fr_1fr_1fr_1fr]"
    >
      <BestCell {...props} />
      <NetBenefitCell {...props} />
      <ProbabilityCell {...props} />
      <EvpiCell {...props} />
    </section>
  );
}

function BestCell({ now, was, names, threshold }: AnswerStripProps) {
  const { t } = useTranslation();
  const changed = was && was.best !== now.best ? names.get(was.best) : null;
  return (
    <Cell label={t('strip.bestAt', { threshold })} was={changed}>
      <Steady others={[...names.values()]} className="">
        <span data-figure="best">{names.get(now.best)}</span>
      </Steady>
      {now.tied.length > 0 && (
        <Small>
          {t('strip.tied', { strategies: now.tied.map((id) => names.get(id)).join(', ') })}
        </Small>
      )}
    </Cell>
  );
}

function NetBenefitCell({ now, was, names, comparator, symbol, language }: AnswerStripProps) {
  const { t } = useTranslation();
  const words = ({ netBenefit }: Answer) =>
    formatMoney(netBenefit, symbol, language, { signed: true });
  const text = words(now);
  const before = was && words(was) !== text ? words(was) : null;
  const isComparator = now.best === comparator;
  return (
    <Cell
      label={t('strip.netBenefit', { comparator: names.get(comparator) })}
      was={before}
      note={isComparator ? t('strip.isComparator') : null}
    >
      <Figure name="netBenefit" value={now.netBenefit}>
        {text}
      </Figure>
    </Cell>
  );
}

function ProbabilityCell({ now, was, run, language }: AnswerStripProps) {
  const { t } = useTranslation();
  const words = ({ probabilityBest }: Chances) =>
    formatProbability(probabilityBest.value, language);
  if (!now.chances) {
    return (
      <Cell label={t('strip.probability')}>
        <Pending run={run} language={language} />
      </Cell>
    );
  }
  const { probabilityBest } = now.chances;
  const before =
    was?.chances && words(was.chances) !== words(now.chances) ? words(was.chances) : null;
  return (
    <Cell label={t('strip.probability')} was={before}>
      <Figure name="probabilityBest" value={probabilityBest.value}>
        {words(now.chances)}
      </Figure>{' '}
      <MonteCarlo estimate={probabilityBest} decimals={2} language={language} />
    </Cell>
  );
}

function EvpiCell({ now, was, symbol, beneficiaries, language }: AnswerStripProps) {
  const { t } = useTranslation();
  // No more decimals than the error of the run allows.
  const words = ({ evpi }: Chances) =>
    formatMoney(evpi.value, symbol, language, { decimals: decimalsFor(evpi) });
  if (!now.chances) {
    return (
      <Cell label={t('strip.evpi')}>
        <span className="text-mute">{t('strip.noNumber')}</span>
        {beneficiaries && <Small>{ROOM}</Small>}
      </Cell>
    );
  }
  const { evpi, populationEvpi } = now.chances;
  const population = (value: number) =>
    t('strip.population', { amount: formatLargeMoney(value, symbol, language) });
  const before =
    was?.chances && words(was.chances) !== words(now.chances) ? words(was.chances) : null;
  return (
    <Cell label={t('strip.evpi')} was={before}>
      <Figure name="evpi" value={evpi.value}>
        {words(now.chances)}
      </Figure>{' '}
      <MonteCarlo estimate={evpi} decimals={decimalsFor(evpi)} language={language} />
      {populationEvpi && (
        <Small>
          <Steady others={[population(LONGEST)]} className="">
            <data value={populationEvpi.value} data-figure="populationEvpi">
              {population(populationEvpi.value)}
            </data>
          </Steady>
          <span className="sr-only"> ({beneficiaries})</span>
        </Small>
      )}
    </Cell>
  );
}

/** A sum that takes as much room as any. */
const LONGEST = 888_000_000;
/** Holds the place of a line that may come, so that the page does not jump when it does. */
const ROOM = '\u00A0';

/** The error of a run of so many draws: small, and where there is room. */
function MonteCarlo(props: { estimate: Estimate; decimals: number; language: Language }) {
  const { t } = useTranslation();
  const { standardError } = props.estimate;
  if (standardError === null || standardError === 0) return null;
  const smallest = 10 ** -props.decimals;
  const shown = formatNumber(Math.max(standardError, smallest), props.language, {
    decimals: props.decimals,
  });
  return (
    <span
      className="ml-1 text-sm font-normal whitespace-nowrap text-mute"
      title={t('strip.monteCarlo')}
    >
      ± {shown}
    </span>
  );
}

/** As many decimals as the first figure of the error takes. */
function decimalsFor({ standardError }: Estimate): number {
  if (!standardError) return 0;
  return Math.min(2, Math.max(0, -Math.floor(Math.log10(standardError))));
}

interface CellProps {
  readonly label: string;
  readonly was?: string | null | undefined;
  /** Said where there is no "was" to say. */
  readonly note?: string | null;
  readonly children: ReactNode;
}

function Cell(props: CellProps) {
  const { t } = useTranslation();
  return (
    <div className="min-w-0 border-rule py-2.5 pr-3 even:border-l even:pl-3 md:pr-4 md:not-first:border-l md:not-first:pl-4 max-md:nth-3:border-t max-md:nth-4:border-t">
      <p className="text-sm text-mute">{props.label}</p>
      <div className="text-lg leading-snug font-bold sm:text-xl">{props.children}</div>
      {props.was ? (
        <p className="text-sm text-brass">{t('strip.was', { before: props.was })}</p>
      ) : (
        <p className="text-sm text-mute">{props.note ?? ROOM}</p>
      )}
    </div>
  );
}

function Small({ children }: { children: ReactNode }) {
  return <span className="block text-sm font-normal text-mute">{children}</span>;
}
