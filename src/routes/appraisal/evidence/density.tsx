import { useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import type { Univariate } from '../../../../shared/engine/distributions/univariate.ts';
import { formatValue } from '../../../i18n/format.ts';
import type { Language } from '../../../store/settings.ts';

const WIDTH = 260;
const HEIGHT = 84;
const BASE = 66;
const POINTS = 140;

interface DensityProps {
  readonly law: Univariate;
  /** The base value. */
  readonly value: number;
  readonly unit: string;
  readonly language: Language;
}

/** A small picture of how likely which values are: density, mean, 95% interval. */
export function Density({ law, value, unit, language }: DensityProps) {
  const { t } = useTranslation();
  const shape = useMemo(() => shapeOf(law), [law]);
  const words = wordsOf(law, language);
  const text = t(Number.isFinite(law.mean) ? 'register.density' : 'register.densityNoMean', {
    ...words,
    unit,
  });
  if (!shape) return <p className="text-sm text-mute">{text}</p>;
  const { path, x, body } = shape;
  const [low, high] = [law.quantile(0.025), law.quantile(0.975)];
  return (
    <figure className="min-w-0">
      <svg
        viewBox={`0 0 ${WIDTH} ${HEIGHT}`}
        className="w-full max-w-[360px]"
        role="img"
        aria-label={text}
      >
        <path d={body} fill="var(--brass-soft)" />
        <path d={path} fill="none" stroke="var(--ink)" strokeWidth="1.8" />
        <path d={`M0 ${BASE} H${WIDTH}`} stroke="var(--rule-strong)" />
        <path
          d={`M${x(low)} ${BASE + 5} V${BASE + 13} M${x(low)} ${BASE + 9} H${x(high)} M${x(high)} ${BASE + 5} V${BASE + 13}`}
          stroke="var(--ink)"
          strokeWidth="1.4"
          fill="none"
        />
        {Number.isFinite(law.mean) && (
          <path d={`M${x(law.mean)} 4 V${BASE}`} stroke="var(--mute)" strokeDasharray="3 3" />
        )}
        <path
          d={`M${x(value)} ${BASE} l-4 -8 h8 Z`}
          fill="var(--brass)"
          stroke="var(--paper)"
          strokeWidth="0.8"
        />
      </svg>
      <figcaption className="text-sm text-mute">{text}</figcaption>
    </figure>
  );
}

function wordsOf(law: Univariate, language: Language) {
  const figure = (number: number) => formatValue(Number(number.toPrecision(4)), language);
  return {
    mean: figure(law.mean),
    low: figure(law.quantile(0.025)),
    high: figure(law.quantile(0.975)),
  };
}

/** Null where there is nothing to draw: one value, or a list of them. */
function shapeOf(law: Univariate) {
  const [from, to] = [law.quantile(0.002), law.quantile(0.998)];
  if (law.discrete || !(to > from) || !Number.isFinite(to - from)) return null;
  const span = to - from;
  const x = (at: number) => round(Math.min(1, Math.max(0, (at - from) / span)) * (WIDTH - 2) + 1);
  const values = Array.from({ length: POINTS + 1 }, (_, step) => from + (span * step) / POINTS);
  const densities = values.map((at) => law.pdf(at));
  // A density without bounds at an end is cut there.
  const finite = densities.filter(Number.isFinite).sort((a, b) => a - b);
  const top = Math.min(finite.at(-1) ?? 1, 3 * (finite[Math.floor(finite.length * 0.9)] ?? 1)) || 1;
  const y = (density: number) => round(BASE - Math.min(1, density / top) * (BASE - 6));
  const points = values.map((at, step) => ({ at, y: y(densities[step] ?? 0) }));
  const line = (part: typeof points) => part.map((one) => `${x(one.at)} ${one.y}`).join(' L');
  const [low, high] = [law.quantile(0.025), law.quantile(0.975)];
  const inside = points.filter(({ at }) => at >= low && at <= high);
  const body =
    inside.length > 1
      ? `M${x(inside[0]?.at ?? 0)} ${BASE} L${line(inside)} L${x(inside.at(-1)?.at ?? 0)} ${BASE} Z`
      : '';
  return { path: `M${line(points)}`, body, x };
}

const round = (number: number) => Math.round(number * 10) / 10;
