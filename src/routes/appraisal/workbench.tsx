/** An opened appraisal: rail on the left, answer strip on top, the step in the middle. */
import { useEffect, useMemo, useRef, useState } from 'react';
import { useTranslation } from 'react-i18next';
import { Outlet } from 'react-router-dom';
import type { Draws } from '../../../shared/analysis/psa/draws.ts';
import type { ModelDocument, Question } from '../../../shared/model/document.ts';
import { hasErrors } from '../../../shared/model/issue.ts';
import { thresholdInForce } from '../../../shared/model/threshold.ts';
import { AnswerStrip } from '../../features/answer-strip/answer-strip.tsx';
import { ExplainProvider } from '../../features/explain/provider.tsx';
import { formatMoney } from '../../i18n/format.ts';
import { outcomeWords } from '../../i18n/outcome-words.ts';
import { answerAt, type Comparison, compareMeans } from '../../store/answer.ts';
import type { DrawsRun, DrawsState } from '../../store/draws.ts';
import type { Levers } from '../../store/levers.ts';
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
  readonly levers: Levers;
}

/** One tree whether the model is whole, broken or being worked out: whoever types stays there. */
export function Workbench({ slug, live, levers }: WorkbenchProps) {
  const { document, issues } = useSession();
  const { language } = useSettings();
  const { question } = document;
  const [place, move] = usePoise(getSettings().thresholds[slug] ?? thresholdInForce(question));
  useKeptThreshold(slug, place);
  useThresholdInForce(question, move);
  const result = useResult(live, place.now, move);
  const context: AppraisalContext = { slug, document, issues, levers, language, result };
  return (
    <ExplainProvider document={result?.document ?? document}>
      <Frame
        strip={
          <>
            <LeversNotice levers={levers} />
            <Strip live={live} result={result} place={place} />
          </>
        }
      >
        <Outlet context={context} />
      </Frame>
    </ExplainProvider>
  );
}

function useResult(live: WorkbenchProps['live'], at: number, move: Result['move']): Result | null {
  const { t } = useTranslation();
  const { language } = useSettings();
  const [basis, setBasis] = useState<Basis>('base');
  const { now: answered, was: before, run: start, stop } = live;
  const document = answered?.document ?? null;
  const state = answered?.draws ?? NO_DRAWS;
  const run = useMemo<DrawsRun>(() => ({ state, run: start, stop }), [state, start, stop]);
  const comparison = useComparison(basis, answered);
  const now = useAnswer(answered, comparison, at);
  const former = useComparison(basis, before);
  const then = useAnswer(before, former, at);
  const names = useMemo(() => document && namesOf(document), [document]);
  if (!document || !comparison || !now || !names) return null;
  const { question } = document;
  const outcome = outcomeWords(question, t);
  const { symbol } = question.currency;
  const thresholdWords = (threshold: number) =>
    t('threshold', { amount: formatMoney(threshold, symbol, language), unit: outcome.per });
  const words = { names, outcome, thresholdWords };
  const was = former && then && { comparison: former, answer: then };
  return { document, comparison, basis, setBasis, now, was, run, move, ...words };
}

interface StripProps {
  readonly live: LiveState;
  readonly result: Result | null;
  readonly place: PoisePlace;
}

function Strip({ live, result, place }: StripProps) {
  const { document, issues } = useSession();
  if (live.now && result)
    return <Answer live={live} now={live.now} result={result} place={place} />;
  return hasErrors(issues) ? <BrokenStrip issues={issues} document={document} /> : <WaitingStrip />;
}

interface AnswerProps extends StripProps {
  readonly result: Result;
  readonly now: Answered;
}

function Answer({ live, now, result, place }: AnswerProps) {
  const { language } = useSettings();
  const { question } = result.document;
  const earlier = useEarlier(now, live.was, place);
  const then = earlier?.answered ?? null;
  const was = useAnswer(then, useComparison(result.basis, then), earlier?.threshold ?? 0);
  return (
    <AnswerStrip
      now={result.now}
      was={was}
      names={then ? new Map([...namesOf(then.document), ...result.names]) : result.names}
      comparator={question.comparator}
      threshold={result.thresholdWords(place.now)}
      symbol={question.currency.symbol}
      beneficiaries={question.beneficiaries?.label}
      run={result.run}
      language={language}
    />
  );
}

/** On every step: numbers that are not the model's own must not be taken for them. */
function LeversNotice({ levers }: { levers: Levers }) {
  const { t } = useTranslation();
  const count = levers.overrides.length;
  if (count === 0) return null;
  return (
    <section
      aria-label={t('levers.notice')}
      className="flex flex-wrap items-center gap-x-4 bg-brass-soft px-3"
    >
      {t('levers.inForce', { count })}
      <button
        type="button"
        className="min-h-11 underline underline-offset-4"
        onClick={() => levers.set([])}
      >
        {t('levers.drop')}
      </button>
    </section>
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

const NO_DRAWS: DrawsState = { status: 'none' };

function drawsOf(answered: Answered | null): Draws | null {
  return answered?.draws.status === 'done' ? answered.draws.draws : null;
}

function useComparison(basis: Basis, answered: Answered | null): Comparison | null {
  const base = answered?.comparison ?? null;
  const draws = drawsOf(answered);
  return useMemo(
    () => (basis === 'mean' && draws ? compareMeans(draws) : base),
    [basis, draws, base],
  );
}

function useAnswer(answered: Answered | null, comparison: Comparison | null, threshold: number) {
  const document = answered?.document ?? null;
  const draws = drawsOf(answered);
  return useMemo(
    () => document && comparison && answerAt(document, comparison, draws, threshold),
    [document, comparison, draws, threshold],
  );
}

/** Strategies' names by id. */
function namesOf({ strategies }: ModelDocument): Map<string, string> {
  return new Map(strategies.map(({ id, label }) => [id, label]));
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
