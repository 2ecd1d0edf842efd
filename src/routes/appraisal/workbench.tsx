/** An opened appraisal: rail on the left, answer strip on top, the step in the middle. */
import { useEffect, useMemo, useRef, useState } from 'react';
import { useTranslation } from 'react-i18next';
import { Outlet } from 'react-router-dom';
import type { Draws } from '../../../shared/analysis/psa/draws.ts';
import type { ModelDocument, Question } from '../../../shared/model/document.ts';
import { hasErrors } from '../../../shared/model/issue.ts';
import { AnswerStrip } from '../../features/answer-strip/answer-strip.tsx';
import { formatMoney } from '../../i18n/format.ts';
import { outcomeWords } from '../../i18n/outcome-words.ts';
import { answerAt, type Comparison, compareMeans } from '../../store/answer.ts';
import type { DrawsRun } from '../../store/draws.ts';
import type { Answered, LiveState } from '../../store/live-answer.ts';
import { type PoisePlace, usePoise } from '../../store/poise.ts';
import { changeSettings, getSettings, useSettings } from '../../store/settings.ts';
import { BrokenStrip } from './broken-strip.tsx';
import type { AppraisalContext, Basis, Result } from './context.ts';
import { Frame } from './frame.tsx';
import { useSession } from './session-context.ts';
import { useEarlier } from './use-earlier.ts';

interface WorkbenchProps {
  /** Address of the appraisal, or of the example. */
  readonly slug: string;
  readonly live: LiveState & Pick<DrawsRun, 'run' | 'stop'>;
}

export function Workbench({ slug, live }: WorkbenchProps) {
  const { document, issues } = useSession();
  const { language } = useSettings();
  const { question } = document;
  const [place, move] = usePoise(getSettings().thresholds[slug] ?? thresholdInForce(question));
  const [basis, setBasis] = useState<Basis>('base');
  useKeptThreshold(slug, place);
  useThresholdInForce(question, move);
  const common = { slug, document, issues, language };
  if (live.now) {
    const weighing = { place, move, basis, setBasis };
    return <Whole {...common} {...weighing} live={live} now={live.now} />;
  }
  const strip = hasErrors(issues) ? (
    <BrokenStrip issues={issues} document={document} />
  ) : (
    <WaitingStrip />
  );
  return (
    <Frame strip={strip}>
      <Outlet context={{ ...common, result: null } satisfies AppraisalContext} />
    </Frame>
  );
}

interface WholeProps
  extends Omit<AppraisalContext, 'result'>,
    Pick<Result, 'move' | 'basis' | 'setBasis'> {
  readonly live: WorkbenchProps['live'];
  readonly now: Answered;
  readonly place: PoisePlace;
}

function Whole(props: WholeProps) {
  const { t } = useTranslation();
  const { slug, issues, language, live, now: answered, place, move, basis, setBasis } = props;
  const { document } = answered;
  const { question } = document;
  const { draws: state } = answered;
  const { run: start, stop } = live;
  const run = useMemo<DrawsRun>(() => ({ state, run: start, stop }), [state, start, stop]);
  const comparison = useComparison(basis, answered);
  const now = useMemo(
    () => answerAt(document, comparison, drawsOf(answered), place.now),
    [document, comparison, answered, place.now],
  );
  const earlier = useEarlier(answered, live.was, place);
  const before = useComparison(basis, earlier?.answered ?? answered);
  const then = earlier?.answered ?? null;
  const threshold = earlier?.threshold ?? 0;
  const was = useMemo(
    () => then && answerAt(then.document, before, drawsOf(then), threshold),
    [then, before, threshold],
  );
  const names = useMemo(() => namesOf(document), [document]);
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
      names={then ? new Map([...namesOf(then.document), ...names]) : names}
      comparator={question.comparator}
      threshold={thresholdWords(place.now)}
      symbol={symbol}
      beneficiaries={question.beneficiaries?.label}
      run={run}
      language={language}
    />
  );
  const context = { slug, document: props.document, issues, language, result };
  return (
    <Frame strip={strip}>
      <Outlet context={context satisfies AppraisalContext} />
    </Frame>
  );
}

function WaitingStrip() {
  const { t } = useTranslation();
  return (
    <div className="flex min-h-36 items-center border-b border-rule" role="status">
      <p className="text-mute">{t('strip.working')}</p>
    </div>
  );
}

function drawsOf({ draws }: Answered): Draws | null {
  return draws.status === 'done' ? draws.draws : null;
}

function useComparison(basis: Basis, answered: Answered): Comparison {
  const { comparison } = answered;
  const draws = drawsOf(answered);
  return useMemo(
    () => (basis === 'mean' && draws ? compareMeans(draws) : comparison),
    [basis, draws, comparison],
  );
}

/** Strategies' names by id. */
function namesOf({ strategies }: ModelDocument): Map<string, string> {
  return new Map(strategies.map(({ id, label }) => [id, label]));
}

/** The one that the question names, or the first. */
function thresholdInForce({ thresholds, thresholdInForce: chosen }: Question): number {
  return (thresholds.find(({ id }) => id === chosen) ?? thresholds[0])?.value ?? 0;
}

/** The poise goes to the threshold in force when the question changes it. */
function useThresholdInForce(question: Question, move: Result['move']): void {
  const value = thresholdInForce(question);
  const last = useRef(value);
  useEffect(() => {
    if (last.current === value) return;
    last.current = value;
    move({ to: value, starts: true });
  }, [value, move]);
}

const REST = 400;

/** Keeps where the poise came to rest, for the next visit. */
function useKeptThreshold(slug: string, { now, was }: PoisePlace): void {
  useEffect(() => {
    if (was === null) return;
    const timer = setTimeout(() => {
      changeSettings({ thresholds: { ...getSettings().thresholds, [slug]: now } });
    }, REST);
    return () => clearTimeout(timer);
  }, [slug, now, was]);
}
