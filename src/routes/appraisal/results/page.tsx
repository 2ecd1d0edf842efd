import { useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import { toHealth } from '../../../../shared/analysis/direction.ts';
import { frontierSegments } from '../../../../shared/analysis/frontier-segments.ts';
import { frontierRows } from '../../../../shared/analysis/incremental.ts';
import { addScenario } from '../../../../shared/model/edit/add-scenario.ts';
import { IssueList } from '../../../components/issue-list.tsx';
import { usePageTitle } from '../../../components/page-title.ts';
import { Steady } from '../../../components/steady.tsx';
import { useExplain } from '../../../features/explain/use-explain.ts';
import { Frontier } from '../../../features/frontier/frontier.tsx';
import {
  type FormerRow,
  IncrementalTable,
} from '../../../features/incremental/incremental-table.tsx';
import { Levers } from '../../../features/levers/levers.tsx';
import { IN_STRIP } from '../broken-strip.tsx';
import { type AppraisalContext, type Result, useAppraisalContext } from '../context.ts';
import { useSession } from '../session-context.ts';
import { basisWords } from './basis.tsx';
import { findingWords } from './finding-words.ts';
import { More } from './more/more.tsx';
import { Weighing } from './weighing.tsx';

const HEADING = 'text-2xl leading-tight font-bold text-balance sm:text-[1.65rem]';

export function Component() {
  const { t } = useTranslation();
  const context = useAppraisalContext();
  usePageTitle(t('steps.results'), context.document?.question.title ?? '');
  return context.result ? (
    <Results {...context} result={context.result} />
  ) : (
    <NoResults {...context} />
  );
}

/** Nothing to show yet, or nothing that may be shown: the strip says which. */
function NoResults(context: AppraisalContext) {
  const { t } = useTranslation();
  const { issues, document, levers } = context;
  const errors = issues.filter(({ severity }) => severity === 'error');
  if (errors.length === 0) return <h1 className="mt-7 text-2xl">{t('steps.results')}</h1>;
  return (
    <>
      <h1 className="mt-7 text-2xl">{t('broken.title')}</h1>
      <p className="mt-1 mb-4 max-w-prose text-mute">{t('broken.body')}</p>
      {errors.length > IN_STRIP && <IssueList issues={errors} document={document} />}
      {levers.overrides.length > 0 && <WhatIf {...context} />}
    </>
  );
}

/** What-ifs on the draft; kept ones become scenarios of it. */
function WhatIf({ document, levers, language }: AppraisalContext) {
  const { t } = useTranslation();
  const { edit, readOnly } = useSession();
  const keep = (label: string) =>
    edit(
      addScenario(document, { label, overrides: levers.overrides }).edits,
      t('levers.keepLabel', { label }),
    );
  return <Levers {...{ document, levers, language }} onKeep={readOnly ? null : keep} />;
}

function Results(context: AppraisalContext & { result: Result }) {
  const { t } = useTranslation();
  const { slug, result, issues, language } = context;
  const { document, comparison, now, names, outcome, thresholdWords } = result;
  const { symbol } = document.question.currency;
  const { direction } = document.question.outcome;
  const finding = (strategy: string) =>
    findingWords(comparison.rows, strategy, { t, names, thresholdWords, symbol, language });
  const segments = useMemo(
    () => frontierSegments(comparison.rows, Number.POSITIVE_INFINITY),
    [comparison],
  );
  const points = useMemo(() => frontierPoints({ document, comparison }), [document, comparison]);
  const explain = useExplain();
  const { invented } = document.about;
  const source = useMemo(() => ({ name: slug, invented }), [slug, invented]);
  const outcomes = new Map(points.map(({ id, outcome: value }) => [id, value]));
  return (
    <>
      <div className="mt-7 max-w-[60rem]">
        <Steady others={segments.map(({ strategy }) => finding(strategy))} className={HEADING}>
          <h1 className={HEADING}>{finding(now.best)}</h1>
        </Steady>
      </div>
      <Weighing result={result} language={language} />
      <WhatIf {...context} />
      <div className="mt-9 grid gap-10 min-[1120px]:grid-cols-[1.25fr_1fr]">
        <section aria-labelledby="incremental-title" className="min-w-0">
          <h2 id="incremental-title" className="mb-2.5 text-lg">
            {segments.length > 1 ? t('table.title') : t('table.titleAlone')}
          </h2>
          <IncrementalTable
            rows={comparison.rows}
            outcomes={outcomes}
            nmb={now.nmb}
            errors={comparison.errors}
            names={names}
            was={formerOf(result)}
            best={now.best}
            symbol={symbol}
            outcome={outcome}
            onExplain={(strategy, measure) => explain?.({ what: 'total', strategy, measure })}
            language={language}
          />
          <p className="mt-2 text-sm text-mute">
            {t('table.note', {
              threshold: thresholdWords(now.threshold),
              basis: basisWords(result, t),
            })}
          </p>
        </section>
        <Frontier
          points={points}
          fewerIsBetter={direction === 'fewerIsBetter'}
          symbol={symbol}
          unit={outcome.plural}
          source={source}
          language={language}
        />
      </div>
      <Notes result={result} issues={issues} />
      <More
        result={result}
        slug={slug}
        onOccupancy={(strategy, state, cycle) =>
          explain?.({ what: 'occupancy', strategy, state, cycle })
        }
      />
    </>
  );
}

/** The table's numbers before the last change. */
function formerOf({ was, document }: Result): ReadonlyMap<string, FormerRow> | null {
  if (!was) return null;
  const { direction } = document.question.outcome;
  return new Map(
    was.comparison.rows.map(({ id, cost, health, icer }) => [
      id,
      { cost, outcome: toHealth(health, direction), icer, nmb: was.answer.nmb.get(id) ?? null },
    ]),
  );
}

function frontierPoints({ document, comparison }: Pick<Result, 'document' | 'comparison'>) {
  const { direction } = document.question.outcome;
  const onFrontier = new Set(frontierRows(comparison.rows).map(({ id }) => id));
  return comparison.rows.map(({ id, cost, health }) => {
    const index = document.strategies.findIndex((strategy) => strategy.id === id);
    // Turning twice gives the outcome back in its own direction.
    const outcome = toHealth(health, direction);
    const name = document.strategies[index]?.label ?? id;
    return { id, name, index, cost, outcome, onFrontier: onFrontier.has(id) };
  });
}

/** What the reader should know of the runs: warnings, and where the means say otherwise. */
function Notes({ result, issues }: { result: Result; issues: AppraisalContext['issues'] }) {
  const { t } = useTranslation();
  const { now, run, names, document } = result;
  const problems = run.state.status === 'done' ? run.state.problems : [];
  const all = [...issues, ...problems];
  const onMean = now.chances?.bestOnMean;
  if (all.length === 0 && !onMean) return null;
  return (
    <section aria-labelledby="notes-title" className="mt-9">
      <h2 id="notes-title" className="mb-2 text-lg">
        {t('notes.title')}
      </h2>
      {onMean && <p className="mb-2">{t('notes.bestOnMean', { strategy: names.get(onMean) })}</p>}
      {all.length > 0 && <IssueList issues={all} document={document} />}
    </section>
  );
}
