/** What totals are made of: one bar a total, one piece a part. */
import { useId } from 'react';
import { Bar, BarChart, CartesianGrid, ReferenceLine, XAxis, YAxis } from 'recharts';
import { textWidth } from '../text-width.ts';
import { useWidth } from '../use-width.ts';
import { Hatches, hatchFill } from './hatches.tsx';
import { FillKey } from './key.tsx';
import { keyRows, TEXT, TICK, valueAxis } from './layout.ts';

export interface BarsProps {
  readonly bars: readonly {
    readonly id: string;
    readonly name: string;
    /** One a part. */
    readonly values: readonly number[];
  }[];
  readonly parts: readonly { readonly id: string; readonly name: string }[];
  readonly xTitle: string;
  readonly writeX: (value: number, decimals: number) => string;
  readonly alt: string;
}

const BAR = 52;
const BELOW = 50;
const RIGHT = 28;

export function Bars({ bars, parts, writeX, ...props }: BarsProps) {
  const [box, width] = useWidth<HTMLDivElement>(560);
  const chart = useId();
  const widest = Math.max(0, ...bars.map(({ name }) => textWidth(name)));
  const left = Math.min(widest + 14, 0.36 * width);
  const x = valueAxis(bars.flatMap(extremes), true);
  const ticks = x.ticks.filter((_, index) => width > 480 || index % 2 === 0);
  const fills = parts.map((part, index) => ({ ...part, fill: hatchFill(chart, index) }));
  const key = keyRows(fills, width);
  const plot = bars.length * BAR;
  const rows = bars.map(({ name, values }) => ({
    name,
    ...Object.fromEntries(parts.map(({ id }, index) => [`part-${id}`, values[index]])),
  }));
  return (
    <div ref={box} role="img" aria-label={props.alt}>
      <BarChart
        layout="vertical"
        width={width}
        height={plot + BELOW + key.height + 8}
        data={rows}
        stackOffset="sign"
        barCategoryGap={10}
        margin={{ top: 4, right: RIGHT, bottom: BELOW + key.height - 26, left: 0 }}
        accessibilityLayer={false}
      >
        <Hatches chart={chart} count={parts.length} />
        <CartesianGrid horizontal={false} stroke="var(--rule)" />
        <XAxis
          type="number"
          height={30}
          domain={[x.low, x.high]}
          ticks={ticks}
          tickFormatter={(tick: number) => writeX(tick, x.decimals)}
          interval={0}
          tick={TICK}
          stroke="var(--rule-strong)"
        />
        <YAxis
          type="category"
          dataKey="name"
          width={left}
          interval={0}
          tick={TICK}
          axisLine={false}
          tickLine={false}
        />
        {fills.map(({ id, name, fill }) => (
          <Bar
            key={id}
            dataKey={`part-${id}`}
            name={name}
            stackId="total"
            fill={fill}
            stroke="var(--paper)"
            isAnimationActive={false}
          />
        ))}
        <ReferenceLine x={0} stroke="var(--ink)" />
        <text x={width - 2} y={plot + BELOW} fontSize={TEXT} textAnchor="end">
          {props.xTitle}
        </text>
        <FillKey places={key.places} top={plot + BELOW + 8} />
      </BarChart>
    </div>
  );
}

/** How far a bar reaches to both sides. */
function extremes({ values }: BarsProps['bars'][number]): number[] {
  const sum = (keep: (value: number) => boolean) =>
    values.filter(keep).reduce((total, value) => total + value, 0);
  return [sum((value) => value < 0), sum((value) => value > 0)];
}
