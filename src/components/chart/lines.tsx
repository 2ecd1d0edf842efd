/** Lines over a level axis of numbers: a colour, a dash and markers each. */
import {
  Area,
  CartesianGrid,
  ComposedChart,
  Line,
  ReferenceLine,
  Tooltip,
  XAxis,
  YAxis,
} from 'recharts';
import type { StrategyMark } from '../strategy-mark.tsx';
import { textWidth } from '../text-width.ts';
import { useWidth } from '../use-width.ts';
import { LineKey, Marker } from './key.tsx';
import {
  BOTTOM,
  endRoom,
  exactAxis,
  keyRows,
  numbersWidth,
  spreadLabels,
  TEXT,
  TICK,
  TOP,
  valueAxis,
} from './layout.ts';

export interface ChartLine {
  readonly id: string;
  readonly name: string;
  readonly mark: StrategyMark;
  /** One for each x; null where there is none. */
  readonly values: readonly (number | null)[];
  /** A band about it, such as a confidence interval: one pair for each x. */
  readonly band?: readonly (readonly [number, number] | null)[];
  /** Drawn broad beneath the others, without markers. */
  readonly under?: boolean;
}

export interface LinesProps {
  readonly x: readonly number[];
  readonly lines: readonly ChartLine[];
  /** Titles with their units. */
  readonly xTitle: string;
  readonly yTitle: string;
  readonly writeX: (value: number) => string;
  /** @param decimals that tell the numbers of the axis apart */
  readonly writeY: (value: number, decimals?: number) => string;
  /** A place along the level axis to be marked, in words. */
  readonly mark?: { readonly at: number; readonly label: string };
  /** What the upright axis spans; else the values. */
  readonly span?: readonly [number, number];
  readonly fromZero?: boolean;
  /** Said to those who do not see it. */
  readonly alt: string;
}

const PLOT = 250;
const RIGHT = 22;
/** Markers along a line: enough to follow it in grey. */
const MARKERS = 6;

export function Lines(props: LinesProps) {
  const { x, lines, writeX, mark } = props;
  const [box, width] = useWidth<HTMLDivElement>(560);
  const values = lines.flatMap((line) => [
    ...line.values.filter((value) => value !== null),
    ...(line.band ?? []).flatMap((pair) => pair ?? []),
  ]);
  const y = props.span
    ? exactAxis(props.span[0], props.span[1], 6)
    : valueAxis(values, props.fromZero ?? false);
  const writeY = (value: number) => props.writeY(value, y.decimals);
  const left = numbersWidth(y.ticks, writeY);
  const names = lines.map(({ name }) => name);
  const room = lines.length > 1 ? endRoom(names, width) : RIGHT;
  const right = room ?? RIGHT;
  const across = exactAxis(x[0] ?? 0, x.at(-1) ?? 1, tickCount(x, width - left - right, writeX));
  const key = keyRows(room === null ? lines : [], width);
  const height = TOP + PLOT + BOTTOM + key.height;
  const yAt = (value: number) => TOP + (1 - (value - y.low) / (y.high - y.low || 1)) * PLOT;
  const ends = lines.flatMap(({ id, name, values: own }) => {
    const end = own.findLast((value) => value !== null);
    return typeof end === 'number' ? [{ id, name, y: yAt(end) }] : [];
  });
  const labels =
    room === null || lines.length === 1 ? [] : spreadLabels(ends, TEXT + 3, TOP + PLOT);
  const markAt = mark && within(mark.at, across.low, across.high) ? mark : null;
  return (
    <div ref={box} role="img" aria-label={props.alt}>
      <ComposedChart
        width={width}
        height={height}
        data={rowsOf(x, lines)}
        margin={{ top: TOP, right, bottom: BOTTOM + key.height - 30, left: 0 }}
        accessibilityLayer={false}
      >
        <CartesianGrid vertical={false} stroke="var(--rule)" />
        <XAxis
          dataKey="x"
          type="number"
          height={30}
          domain={[across.low, across.high]}
          ticks={[...across.ticks]}
          tickFormatter={(tick: number) => writeX(tick)}
          interval={0}
          tick={TICK}
          stroke="var(--rule-strong)"
        />
        <YAxis
          type="number"
          width={left}
          domain={[y.low, y.high]}
          ticks={[...y.ticks]}
          tickFormatter={(tick: number) => writeY(tick)}
          interval={0}
          tick={TICK}
          axisLine={false}
          tickLine={false}
        />
        <Tooltip
          isAnimationActive={false}
          contentStyle={{ background: 'var(--raised)', borderColor: 'var(--rule-strong)' }}
          itemStyle={{ color: 'var(--ink)' }}
          labelFormatter={(at) => writeX(Number(at))}
          formatter={(value) => (typeof value === 'number' ? props.writeY(value) : null)}
        />
        {y.low < 0 && y.high > 0 && <ReferenceLine y={0} stroke="var(--rule-strong)" />}
        {markAt && <ReferenceLine x={markAt.at} stroke="var(--brass)" strokeWidth={2} />}
        {lines.map(
          ({ id, mark: { color }, band }) =>
            band && (
              <Area
                key={id}
                dataKey={`band-${id}`}
                stroke="none"
                fill={color}
                fillOpacity={0.18}
                isAnimationActive={false}
                tooltipType="none"
                activeDot={false}
              />
            ),
        )}
        {lines.map((line, index) => (
          <Line
            key={line.id}
            dataKey={`line-${line.id}`}
            name={line.name}
            type="linear"
            stroke={line.mark.color}
            strokeWidth={line.under ? 8 : 2.5}
            strokeDasharray={line.mark.dash}
            isAnimationActive={false}
            activeDot={false}
            connectNulls={false}
            dot={(dot: DotPlace) => (
              <Dot key={dot.index} {...dot} line={line} shift={index} count={x.length} />
            )}
          />
        ))}
        <text x={left} y={14} fontSize={TEXT}>
          {props.yTitle}
        </text>
        <text x={width - 2} y={TOP + PLOT + BOTTOM - 4} fontSize={TEXT} textAnchor="end">
          {props.xTitle}
        </text>
        {markAt && (
          <MarkLabel
            label={markAt.label}
            x={
              left +
              ((markAt.at - across.low) / (across.high - across.low)) * (width - left - right)
            }
            right={width}
          />
        )}
        {labels.map(({ id, name, y: at }) => (
          <text key={id} x={width - right + 10} y={at + 5} fontSize={TEXT}>
            {name}
          </text>
        ))}
        <LineKey places={key.places} top={TOP + PLOT + BOTTOM} />
      </ComposedChart>
    </div>
  );
}

/** Within the plot, beside the mark: the poise's threshold in words. */
function MarkLabel(props: { label: string; x: number; right: number }) {
  const fits = props.x + 8 + textWidth(props.label) <= props.right;
  return (
    <text
      x={props.x + (fits ? 8 : -8)}
      y={TOP + 14}
      fontSize={TEXT}
      textAnchor={fits ? 'start' : 'end'}
      stroke="var(--paper)"
      strokeWidth="4"
      paintOrder="stroke"
    >
      {props.label}
    </text>
  );
}

interface DotPlace {
  readonly cx?: number;
  readonly cy?: number;
  readonly index?: number;
}

/** Markers of different lines stand at different places, so that none hides another. */
function Dot(props: DotPlace & { line: ChartLine; shift: number; count: number }) {
  const { cx, cy, index = 0, line, shift, count } = props;
  const every = Math.max(1, Math.floor(count / MARKERS));
  const first = Math.floor((shift * every) / 4) % every;
  const none = cx === undefined || cy === undefined || line.values[index] === null;
  if (none || line.under || index % every !== first) return null;
  return <Marker mark={line.mark} x={cx} y={cy} />;
}

function rowsOf(x: readonly number[], lines: readonly ChartLine[]) {
  return x.map((value, index) => {
    const row: Record<string, unknown> = { x: value };
    for (const { id, values, band } of lines) {
      row[`line-${id}`] = values[index];
      if (band) row[`band-${id}`] = band[index];
    }
    return row;
  });
}

function tickCount(x: readonly number[], room: number, write: (value: number) => string): number {
  const widest = textWidth(write(x.at(-1) ?? 0)) + 24;
  return Math.max(2, Math.min(8, Math.floor(room / widest)));
}

function within(value: number, low: number, high: number): boolean {
  return value >= low && value <= high;
}
