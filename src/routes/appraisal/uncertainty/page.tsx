/** What the draws say: the plane, acceptability, expected loss, EVPI, and how settled it is. */
import { useDeferredValue, useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import type { Draws } from '../../../../shared/analysis/psa/draws.ts';
import { usePageTitle } from '../../../components/page-title.ts';
import { WhenSeen } from '../../../components/when-seen.tsx';
import { Pending } from '../../../features/answer-strip/pending.tsx';
import { beamScale, ticks } from '../../../features/beam/scale.ts';
import { type Curves, curvesOf } from '../../../store/curves.ts';
import { type AppraisalContext, type Result, useAppraisalContext } from '../context.ts';
import { type FigureWords, useFigureWords } from '../figure-words.ts';
import { Acceptability } from './acceptability.tsx';
import { DrawsTable } from './draws-table.tsx';
import { Evpi } from './evpi.tsx';
import { ExpectedLoss } from './loss.tsx';
import { Plane } from './plane.tsx';
import { Running } from './running.tsx';

export interface FigureProps {
  readonly draws: Draws;
  /** Money per unit of health, where the poise stands. */
  readonly threshold: number;
  readonly words: FigureWords;
}

export interface CurvesProps extends FigureProps {
  readonly curves: Curves;
}

export function Component() {
  const { t } = useTranslation();
  const context = useAppraisalContext();
  usePageTitle(t('steps.uncertainty'), context.document?.question.title ?? '');
  if (context.result) return <Uncertainty {...context} result={context.result} />;
  return <h1 className="mt-7 text-2xl">{t('steps.uncertainty')}</h1>;
}

function Uncertainty({ result, slug, language }: AppraisalContext & { result: Result }) {
  const { t } = useTranslation();
  const { document, run, now } = result;
  const words = useFigureWords(document, slug);
  if (document.strategies.length < 2) return <Without words={t('uncertainty.alone')} />;
  if (run.state.status === 'none') return <Without words={t('uncertainty.none')} />;
  if (run.state.status !== 'done') {
    return (
      <>
        <Without words={t('uncertainty.waiting')} />
        <div className="mt-3 max-w-sm">
          <Pending run={run} language={language} />
        </div>
      </>
    );
  }
  const share = now.chances?.probabilityBest.value ?? 0;
  return (
    <>
      <h1 className="mt-7 text-2xl leading-tight">
        {t('uncertainty.finding', {
          strategy: words.nameOf(now.best),
          share: words.percent(share),
          threshold: words.threshold(now.threshold),
        })}
      </h1>
      <p className="mt-1 mb-7 max-w-[62em] text-mute">
        {t('uncertainty.made', {
          count: run.state.draws.cost[0]?.length ?? 0,
          seed: document.analysis.seed,
        })}
      </p>
      <Figures result={result} draws={run.state.draws} words={words} />
    </>
  );
}

function Without({ words }: { words: string }) {
  const { t } = useTranslation();
  return (
    <>
      <h1 className="mt-7 text-2xl">{t('uncertainty.title')}</h1>
      <p className="mt-2 max-w-prose text-mute">{words}</p>
    </>
  );
}

function Figures(props: { result: Result; draws: Draws; words: FigureWords }) {
  const { result, draws, words } = props;
  // The poise moves first; what it is marked on follows when there is time.
  const threshold = useDeferredValue(result.now.threshold);
  const { thresholds } = result.document.question;
  const along = useMemo(() => {
    const policy = thresholds.map(({ value }) => value);
    const icers = result.comparison.rows.flatMap(({ icer }) => icer ?? []);
    const { max, step } = beamScale(policy, icers);
    // The graduations of the arm, and the policy thresholds themselves.
    return [...new Set([...ticks(max, step), ...policy, max])].sort((a, b) => a - b);
  }, [thresholds, result.comparison]);
  const curves = curvesOf(draws, along);
  const all = { draws, threshold, words, curves };
  return (
    <div className="grid gap-x-10 gap-y-12 min-[1120px]:grid-cols-2">
      <Plane {...all} best={result.now.best} />
      <Acceptability {...all} />
      <WhenSeen height={420}>
        <ExpectedLoss {...all} />
      </WhenSeen>
      <WhenSeen height={420}>
        <Evpi {...all} />
      </WhenSeen>
      <WhenSeen height={420}>
        <Running {...all} />
      </WhenSeen>
      <WhenSeen height={420}>
        <DrawsTable draws={draws} words={words} />
      </WhenSeen>
    </div>
  );
}
