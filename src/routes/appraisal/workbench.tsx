/** An opened appraisal: rail on the left, answer strip on top, the step in the middle. */
import { useEffect, useMemo, useState } from 'react';
import { useTranslation } from 'react-i18next';
import { Outlet } from 'react-router-dom';
import type { ModelDocument, Question } from '../../../shared/model/document.ts';
import { hasErrors } from '../../../shared/model/issue.ts';
import { AnswerStrip } from '../../features/answer-strip/answer-strip.tsx';
import { formatMoney } from '../../i18n/format.ts';
import { outcomeWords } from '../../i18n/outcome-words.ts';
import { type Answer, answerAt, type Comparison, compareMeans } from '../../store/answer.ts';
import { type Opened, useBase } from '../../store/appraisal.ts';
import { useDraws } from '../../store/draws.ts';
import { FILE_SLUG } from '../../store/opened-file.ts';
import { type PoisePlace, usePoise } from '../../store/poise.ts';
import { changeSettings, getSettings, useSettings } from '../../store/settings.ts';
import { BrokenStrip } from './broken-strip.tsx';
import type { AppraisalContext, Basis, Result } from './context.ts';
import { Frame } from './frame.tsx';

interface WorkbenchProps {
  readonly slug: string;
  readonly opened: Extract<Opened, { found: true }>;
}

export function Workbench({ slug, opened }: WorkbenchProps) {
  const { document } = opened;
  const { language } = useSettings();
  const base = useBase(document);
  if (base.error) throw base.error;
  const issues = [...opened.issues, ...(base.data?.issues ?? [])];
  const common = { slug, document, issues, language };
  if (document === null || hasErrors(issues)) {
    return (
      <Frame {...opened} strip={<BrokenStrip issues={issues} document={document} />}>
        <Outlet context={{ ...common, result: null } satisfies AppraisalContext} />
      </Frame>
    );
  }
  if (!base.data?.comparison) {
    return (
      <Frame {...opened} strip={<WaitingStrip />}>
        <Outlet context={{ ...common, result: null } satisfies AppraisalContext} />
      </Frame>
    );
  }
  return <Whole {...common} opened={opened} document={document} base={base.data.comparison} />;
}

interface WholeProps extends Omit<AppraisalContext, 'document' | 'result'> {
  readonly opened: WorkbenchProps['opened'];
  readonly document: ModelDocument;
  /** The base case compared. */
  readonly base: Comparison;
}

function Whole({ slug, opened, document, base, issues, language }: WholeProps) {
  const { t } = useTranslation();
  const { question } = document;
  const [place, move] = usePoise(getSettings().thresholds[slug] ?? thresholdInForce(question));
  useKeptThreshold(slug, place);
  const run = useDraws(document);
  const draws = run.state.status === 'done' ? run.state.draws : null;
  const [basis, setBasis] = useState<Basis>('base');
  const comparison = useMemo(
    () => (basis === 'mean' && draws ? compareMeans(draws) : base),
    [basis, draws, base],
  );
  const answer = useMemo(
    () => remembering((threshold) => answerAt(document, comparison, draws, threshold)),
    [document, comparison, draws],
  );
  const now = answer(place.now);
  const was = place.was === null ? null : answer(place.was);
  const names = useMemo(
    () => new Map(document.strategies.map(({ id, label }) => [id, label])),
    [document],
  );
  const outcome = outcomeWords(question, t);
  const { symbol } = question.currency;
  const thresholdWords = (threshold: number) =>
    t('threshold', { amount: formatMoney(threshold, symbol, language), unit: outcome.per });
  const result: Result = {
    document,
    comparison,
    basis,
    setBasis,
    now,
    run,
    move,
    names,
    outcome,
    thresholdWords,
  };
  const strip = (
    <AnswerStrip
      now={now}
      was={was}
      names={names}
      comparator={question.comparator}
      threshold={thresholdWords(place.now)}
      symbol={symbol}
      beneficiaries={question.beneficiaries?.label}
      run={run}
      language={language}
    />
  );
  return (
    <Frame {...opened} strip={strip}>
      <Outlet context={{ slug, document, issues, language, result } satisfies AppraisalContext} />
    </Frame>
  );
}

/** The last answers: "was" is most often the "now" of a moment ago. */
function remembering(work: (threshold: number) => Answer): (threshold: number) => Answer {
  const known = new Map<number, Answer>();
  return (threshold) => {
    const answer = known.get(threshold) ?? work(threshold);
    if (known.size > 50) known.clear();
    known.set(threshold, answer);
    return answer;
  };
}

function WaitingStrip() {
  const { t } = useTranslation();
  return (
    <div className="flex min-h-36 items-center border-b border-rule" role="status">
      <p className="text-mute">{t('strip.working')}</p>
    </div>
  );
}

/** The one that the question names, or the first. */
function thresholdInForce({ thresholds, thresholdInForce: chosen }: Question): number {
  return (thresholds.find(({ id }) => id === chosen) ?? thresholds[0])?.value ?? 0;
}

const REST = 400;

/** Keeps where the poise came to rest, for the next visit. */
function useKeptThreshold(slug: string, { now, was }: PoisePlace): void {
  useEffect(() => {
    // The next file opened is another model: its thresholds say nothing of this one's.
    if (was === null || slug === FILE_SLUG) return;
    const timer = setTimeout(() => {
      changeSettings({ thresholds: { ...getSettings().thresholds, [slug]: now } });
    }, REST);
    return () => clearTimeout(timer);
  }, [slug, now, was]);
}
