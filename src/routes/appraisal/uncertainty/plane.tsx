/** The cost-effectiveness plane: each draw against the comparator. */
import { useMemo } from 'react';
import { summarise } from '../../../../shared/analysis/psa/means.ts';
import {
  type PlaneCloud,
  plane,
  type QuadrantShares,
} from '../../../../shared/analysis/psa/plane.ts';
import { FigureFrame } from '../../../components/chart/figure-frame.tsx';
import { LazyClouds } from '../../../components/chart/lazy.ts';
import { useSettings } from '../../../store/settings.ts';
import type { FigureWords } from '../figure-words.ts';
import type { FigureProps } from './page.tsx';

export function Plane({ draws, threshold, words, best }: FigureProps & { best: string }) {
  const { t, document, outcome, symbol, nameOf, number } = words;
  const { comparator } = document.question;
  const { theme } = useSettings();
  const clouds = useMemo(() => plane(draws, comparator), [draws, comparator]);
  const centres = useMemo(
    () => clouds.map(({ health, cost }) => [summarise(health).mean, summarise(cost).mean] as const),
    [clouds],
  );
  const title = titleOf(clouds.find(({ strategy }) => strategy === best) ?? clouds[0], words);
  return (
    <FigureFrame
      title={title}
      file="plane"
      source={words.source}
      height={420}
      language={words.language}
      table={() => planeTable(clouds, words)}
      note={
        <>
          {clouds.map((cloud) => (
            <span key={cloud.strategy} className="block text-ink">
              {sharesWords(cloud, words)}
            </span>
          ))}
          {t('uncertainty.plane.note', { threshold: words.threshold(threshold) })}
        </>
      }
    >
      <LazyClouds
        clouds={clouds.map(({ strategy, health, cost }, index) => ({
          id: strategy,
          name: nameOf(strategy),
          mark: markOf(strategy, words),
          x: health,
          y: cost,
          centre: centres[index] ?? [0, 0],
        }))}
        slope={{ value: threshold, label: words.threshold(threshold) }}
        xTitle={t('uncertainty.plane.xTitle', {
          unit: outcome.gained,
          comparator: nameOf(comparator),
        })}
        yTitle={t('uncertainty.plane.yTitle', { comparator: nameOf(comparator), symbol })}
        write={number}
        alt={t('charts.alt', { title })}
        theme={theme}
      />
    </FigureFrame>
  );
}

const QUADRANTS = ['northEast', 'southEast', 'southWest', 'northWest', 'onAxis'] as const;

/** The quadrant that holds most of a strategy's draws. */
function titleOf(cloud: PlaneCloud | undefined, { t, nameOf, percent }: FigureWords): string {
  if (!cloud) return '';
  const { shares } = cloud;
  const most = QUADRANTS.reduce((a, b) => (shares[b] > shares[a] ? b : a));
  return t('uncertainty.plane.title', {
    strategy: nameOf(cloud.strategy),
    share: percent(shares[most]),
    words: t(`uncertainty.plane.${most}`),
  });
}

/** Every quadrant that holds a draw, as a sentence. */
function sharesWords({ strategy, shares }: PlaneCloud, words: FigureWords): string {
  const { t, nameOf, percent } = words;
  const parts = QUADRANTS.filter((each) => shares[each as keyof QuadrantShares] > 0).map((each) =>
    t('uncertainty.plane.part', {
      share: percent(shares[each]),
      words: t(`uncertainty.plane.${each}`),
    }),
  );
  return t('uncertainty.plane.shares', { strategy: nameOf(strategy), list: parts.join('; ') });
}

function planeTable(clouds: readonly PlaneCloud[], words: FigureWords) {
  const { t, nameOf, symbol, outcome } = words;
  const count = clouds[0]?.cost.length ?? 0;
  return {
    columns: [
      { head: t('uncertainty.plane.draw'), write: words.number },
      ...clouds.flatMap(({ strategy }) => [
        {
          head: t('uncertainty.plane.cost', { strategy: nameOf(strategy), symbol }),
          write: (value: number) => words.number(value, 2),
        },
        {
          head: t('uncertainty.plane.health', {
            strategy: nameOf(strategy),
            unit: outcome.gained,
          }),
          write: (value: number) => words.number(value, 4),
        },
      ]),
    ],
    rows: Array.from({ length: count }, (_, i) => [
      i + 1,
      ...clouds.flatMap(({ cost, health }) => [cost[i] ?? null, health[i] ?? null]),
    ]),
  };
}

function markOf(strategy: string, { strategies }: FigureWords) {
  const found = strategies.find(({ id }) => id === strategy) ?? strategies[0];
  if (!found) throw new RangeError(`strategy ${strategy}`);
  return found.mark;
}
