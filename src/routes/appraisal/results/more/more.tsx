/** What lies under the answer: trace, breakdowns, net benefit over thresholds, profiles. */
import { useDeferredValue } from 'react';
import { useTranslation } from 'react-i18next';
import { WhenSeen } from '../../../../components/when-seen.tsx';
import { type FullRun, useFullRun } from '../../../../store/base-run.ts';
import type { Result } from '../../context.ts';
import { type FigureWords, useFigureWords } from '../../figure-words.ts';
import { Breakdowns } from './breakdowns.tsx';
import { NetBenefit } from './net-benefit.tsx';
import { Profiles } from './profiles.tsx';
import { Trace } from './trace.tsx';

export interface SectionProps {
  readonly run: FullRun;
  readonly words: FigureWords;
  /** Best at the threshold on the basis in force. */
  readonly best: string;
  readonly threshold: number;
}

interface MoreProps {
  readonly result: Result;
  readonly slug: string;
  /** Takes a point of the trace apart. */
  readonly onOccupancy: (strategy: string, state: string, cycle: number) => void;
}

export function More({ result, slug, onOccupancy }: MoreProps) {
  const { t } = useTranslation();
  const run = useFullRun(result.document);
  const words = useFigureWords(run?.document ?? result.document, slug);
  // The beam moves first; these follow when there is time.
  const threshold = useDeferredValue(result.now.threshold);
  const best = useDeferredValue(result.now.best);
  return (
    <section aria-labelledby="more-title" className="mt-12 border-t border-rule pt-6">
      <h2 id="more-title" className="mb-6 text-xl">
        {t('more.title')}
      </h2>
      {run === null ? (
        <p role="status" className="min-h-96 text-mute">
          {t('more.working')}
        </p>
      ) : (
        <Sections {...{ run, words, best, threshold, onOccupancy }} />
      )}
    </section>
  );
}

function Sections(props: SectionProps & Pick<MoreProps, 'onOccupancy'>) {
  const { strategies, profiles } = props.run.document;
  return (
    <div className="grid gap-12">
      <WhenSeen height={520}>
        <Trace {...props} />
      </WhenSeen>
      <WhenSeen height={460}>
        <Breakdowns {...props} />
      </WhenSeen>
      <div className="grid gap-x-10 gap-y-12 min-[1120px]:grid-cols-2">
        {strategies.length > 1 && (
          <WhenSeen height={420}>
            <NetBenefit {...props} />
          </WhenSeen>
        )}
        {strategies.length > 1 && profiles.length > 1 && (
          <WhenSeen height={420}>
            <Profiles {...props} />
          </WhenSeen>
        )}
      </div>
    </div>
  );
}
