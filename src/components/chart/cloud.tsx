/** Thousands of draws as dots on a canvas, under axes and marks in SVG. */
import { useEffect, useRef } from 'react';
import { type Axis, axis } from '../axis.ts';
import type { StrategyMark } from '../strategy-mark.tsx';
import { textWidth } from '../text-width.ts';
import { useWidth } from '../use-width.ts';
import { LineKey, Marker } from './key.tsx';
import { BOTTOM, keyRows, numbersWidth, TEXT, TOP } from './layout.ts';

export interface Cloud {
  readonly id: string;
  readonly name: string;
  readonly mark: StrategyMark;
  readonly x: Float64Array;
  readonly y: Float64Array;
  /** Their means, marked. */
  readonly centre: readonly [x: number, y: number];
}

export interface CloudsProps {
  readonly clouds: readonly Cloud[];
  /** A line through the origin that rises so much for each unit: the threshold. */
  readonly slope: { readonly value: number; readonly label: string };
  readonly xTitle: string;
  readonly yTitle: string;
  readonly write: (value: number, decimals: number) => string;
  readonly alt: string;
  /** Changes with the theme, so that dots are painted anew. */
  readonly theme: string;
}

const PLOT = 320;
const RIGHT = 16;

export function Clouds(props: CloudsProps) {
  const { clouds, slope, write } = props;
  const [box, width] = useWidth<HTMLDivElement>(560);
  const x = axis(ends(clouds.map((cloud) => cloud.x)), width < 420 ? 4 : 7);
  const y = axis(ends(clouds.map((cloud) => cloud.y)), 7);
  const left = numbersWidth(y.ticks, (tick) => write(tick, y.decimals));
  const plot = { left, top: TOP, width: width - left - RIGHT, height: PLOT };
  const at = (px: number, py: number) => ({
    x: plot.left + part(px, x) * plot.width,
    y: plot.top + (1 - part(py, y)) * plot.height,
  });
  const key = keyRows(clouds, width);
  const height = TOP + PLOT + BOTTOM + key.height;
  const origin = at(0, 0);
  const line = clipped(slope.value, x, y).map(([px, py]) => at(px, py));
  return (
    <div ref={box} className="relative" role="img" aria-label={props.alt}>
      <Dots clouds={clouds} x={x} y={y} plot={plot} theme={props.theme} />
      <svg
        width={width}
        height={height}
        viewBox={`0 0 ${width} ${height}`}
        className="relative block max-w-full"
        aria-hidden="true"
      >
        <text x={left} y={14} fontSize={TEXT}>
          {props.yTitle}
        </text>
        {y.ticks.map((tick) => (
          <text key={tick} x={left - 6} y={at(0, tick).y + 5} fontSize={TEXT} textAnchor="end">
            {write(tick, y.decimals)}
          </text>
        ))}
        {x.ticks.map((tick) => (
          <text
            key={tick}
            x={Math.min(at(tick, 0).x, width - textWidth(write(tick, x.decimals)) / 2)}
            y={TOP + PLOT + 20}
            fontSize={TEXT}
            textAnchor="middle"
          >
            {write(tick, x.decimals)}
          </text>
        ))}
        <path
          d={`M${plot.left} ${origin.y} h${plot.width} M${origin.x} ${TOP} v${PLOT}`}
          stroke="var(--rule-strong)"
        />
        <polyline
          points={line.map((point) => `${point.x},${point.y}`).join(' ')}
          stroke="var(--brass)"
          strokeWidth="2"
        />
        <SlopeLabel label={slope.label} at={line.at(-1) ?? origin} left={left} right={width} />
        {clouds.map(({ id, mark, centre }) => {
          const place = at(...centre);
          return <Marker key={id} mark={mark} x={place.x} y={place.y} />;
        })}
        <text x={width - 2} y={TOP + PLOT + BOTTOM - 4} fontSize={TEXT} textAnchor="end">
          {props.xTitle}
        </text>
        <LineKey places={key.places} top={TOP + PLOT + BOTTOM} />
      </svg>
    </div>
  );
}

function SlopeLabel(props: {
  label: string;
  at: { x: number; y: number };
  left: number;
  right: number;
}) {
  const half = textWidth(props.label) / 2;
  return (
    <text
      x={Math.min(props.right - half - 2, Math.max(props.left + half, props.at.x))}
      y={Math.max(TOP + 14, props.at.y + 14)}
      fontSize={TEXT}
      textAnchor="middle"
      stroke="var(--paper)"
      strokeWidth="4"
      paintOrder="stroke"
    >
      {props.label}
    </text>
  );
}

interface Plot {
  readonly left: number;
  readonly top: number;
  readonly width: number;
  readonly height: number;
}

function Dots(props: { clouds: readonly Cloud[]; x: Axis; y: Axis; plot: Plot; theme: string }) {
  const canvas = useRef<HTMLCanvasElement>(null);
  const { clouds, x, y, plot, theme } = props;
  useEffect(() => {
    const target = canvas.current;
    if (!target) return;
    target.dataset.theme = theme;
    paint(target, clouds, x, y);
  });
  return (
    <canvas
      ref={canvas}
      data-x={plot.left}
      data-y={plot.top}
      className="absolute"
      style={{ left: plot.left, top: plot.top, width: plot.width, height: plot.height }}
    />
  );
}

/** Fewer dots than this are drawn stronger. */
const MANY = 2_000;

function paint(target: HTMLCanvasElement, clouds: readonly Cloud[], x: Axis, y: Axis): void {
  const density = window.devicePixelRatio || 1;
  target.width = Math.round(target.clientWidth * density);
  target.height = Math.round(target.clientHeight * density);
  const context = target.getContext('2d');
  if (!context) return;
  const style = getComputedStyle(target);
  for (const { mark, x: across, y: up } of clouds) {
    context.fillStyle = style.getPropertyValue(mark.color.slice('var('.length, -1)).trim();
    context.globalAlpha = across.length > MANY ? 0.15 : 0.35;
    const size = 2.4 * density;
    for (let i = 0; i < across.length; i++) {
      const px = part(across[i] as number, x) * target.width;
      const py = (1 - part(up[i] as number, y)) * target.height;
      context.fillRect(px - size / 2, py - size / 2, size, size);
    }
  }
}

function part(value: number, { low, high }: Axis): number {
  return (value - low) / (high - low || 1);
}

/** Smallest and largest of all columns, 0 among them. */
function ends(columns: readonly Float64Array[]): [number, number] {
  let [low, high] = [0, 0];
  for (const column of columns) {
    for (let i = 0; i < column.length; i++) {
      low = Math.min(low, column[i] as number);
      high = Math.max(high, column[i] as number);
    }
  }
  return [low, high];
}

/** The stretch of y = slope x that the plot holds. */
function clipped(slope: number, x: Axis, y: Axis): [number, number][] {
  const from = slope > 0 ? Math.max(x.low, y.low / slope) : x.low;
  const to = slope > 0 ? Math.min(x.high, y.high / slope) : x.high;
  return [
    [from, slope * from],
    [to, slope * to],
  ];
}
