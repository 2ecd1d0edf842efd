/** Cost against health, one mark a strategy, the efficiency frontier drawn through. */
import { useId } from 'react';
import { useTranslation } from 'react-i18next';
import { type Axis, axis } from '../../components/axis.ts';
import { Swatch, strategyMark } from '../../components/strategy-mark.tsx';
import { textWidth } from '../../components/text-width.ts';
import { useWidth } from '../../components/use-width.ts';
import { formatNumber } from '../../i18n/format.ts';
import type { Language } from '../../store/settings.ts';
import { placeLabels } from './place-labels.ts';

export interface FrontierPoint {
  readonly id: string;
  readonly name: string;
  /** Place of the strategy in its document. */
  readonly index: number;
  readonly cost: number;
  /** Primary outcome in its own direction. */
  readonly outcome: number;
  readonly onFrontier: boolean;
}

interface FrontierChartProps {
  /** In order of cost. */
  readonly points: readonly FrontierPoint[];
  /** Where fewer is better, the axis runs from more to fewer: better is to the right. */
  readonly fewerIsBetter: boolean;
  readonly costTitle: string;
  readonly outcomeTitle: string;
  readonly title: string;
  readonly language: Language;
}

const HEIGHT = 300;
const TOP = 34;
const BOTTOM = 52;
const RIGHT = 16;

export function FrontierChart(props: FrontierChartProps) {
  const { points, fewerIsBetter, language } = props;
  const { t } = useTranslation();
  const title = useId();
  const [box, width] = useWidth<HTMLDivElement>(480);
  const costs = axis(
    points.map(({ cost }) => cost),
    6,
  );
  const turn = fewerIsBetter ? -1 : 1;
  const health = axis(
    points.map(({ outcome }) => turn * outcome),
    width < 420 ? 4 : 6,
  );
  const costWords = (value: number) => formatNumber(value, language, { decimals: costs.decimals });
  const left = Math.max(...costs.ticks.map((tick) => textWidth(costWords(tick)))) + 10;
  const x = scale(health, left + 4, width - RIGHT);
  const y = scale(costs, HEIGHT - BOTTOM, TOP);
  const at = points.map((point) => ({
    ...point,
    x: x(turn * point.outcome),
    y: y(point.cost),
    label: point.name,
  }));
  const area = { left, right: width, top: TOP - 12, bottom: HEIGHT - BOTTOM + 4 };
  const line = at.filter(({ onFrontier }) => onFrontier);
  const labels = placeLabels(at, line, area);
  return (
    <div ref={box}>
      <svg
        width={width}
        height={HEIGHT}
        viewBox={`0 0 ${width} ${HEIGHT}`}
        className="block max-w-full"
        role="img"
        aria-labelledby={title}
      >
        <title id={title}>{t('frontier.alt', { title: props.title })}</title>
        <text x={left + 4} y={14} fontSize="14" className="fill-mute">
          {props.costTitle}
        </text>
        {costs.ticks.map((tick) => (
          <g key={tick}>
            <line x1={left + 4} x2={width - RIGHT} y1={y(tick)} y2={y(tick)} stroke="var(--rule)" />
            <text x={left - 4} y={y(tick) + 5} fontSize="14" textAnchor="end" className="fill-mute">
              {costWords(tick)}
            </text>
          </g>
        ))}
        {health.ticks.map((tick) => (
          <text
            key={tick}
            x={Math.min(x(tick), width - textWidth(outcomeWords(tick)) / 2)}
            y={HEIGHT - BOTTOM + 22}
            fontSize="14"
            textAnchor="middle"
            className="fill-mute"
          >
            {outcomeWords(tick)}
          </text>
        ))}
        <text x={width - 2} y={HEIGHT - 8} fontSize="14" textAnchor="end" className="fill-mute">
          {props.outcomeTitle}
        </text>
        <polyline
          points={line.map((point) => `${point.x},${point.y}`).join(' ')}
          fill="none"
          stroke="var(--ink)"
          strokeWidth="2"
        />
        {at.map((point) => {
          const { color, marker } = strategyMark(point.index);
          return (
            <path
              key={point.id}
              d={marker}
              transform={`translate(${point.x} ${point.y}) scale(1.1)`}
              fill={color}
              stroke="var(--paper)"
              strokeWidth="1.5"
            />
          );
        })}
        {labels?.map((label) => (
          <text
            key={label.id}
            x={label.x}
            y={label.y}
            fontSize="14"
            textAnchor={label.anchor}
            stroke="var(--paper)"
            strokeWidth="3"
            paintOrder="stroke"
          >
            {points.find(({ id }) => id === label.id)?.name}
          </text>
        ))}
      </svg>
      {labels === null && (
        <ul className="mt-1 grid gap-1">
          {points.map(({ id, name, index }) => (
            <li key={id} className="flex items-center gap-2 text-sm">
              <Swatch index={index} />
              {name}
            </li>
          ))}
        </ul>
      )}
    </div>
  );

  function outcomeWords(tick: number): string {
    return formatNumber(turn * tick, language, { decimals: health.decimals });
  }
}

function scale({ low, high }: Axis, from: number, to: number): (value: number) => number {
  return (value) => from + ((value - low) / (high - low || 1)) * (to - from);
}
