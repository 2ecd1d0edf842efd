/** Shares that sum to one whole, stacked over time. */
import { useId } from 'react';
import { Area, AreaChart, XAxis, YAxis, ZIndexLayer } from 'recharts';
import { textWidth } from '../text-width.ts';
import { useWidth } from '../use-width.ts';
import { Hatches, hatchFill } from './hatches.tsx';
import { FillKey } from './key.tsx';
import { BOTTOM, exactAxis, keyRows, numbersWidth, TEXT, TICK, TOP } from './layout.ts';

export interface StackProps {
  readonly x: readonly number[];
  /** From the bottom up; one value for each x. */
  readonly layers: readonly {
    readonly id: string;
    readonly name: string;
    readonly values: readonly number[];
  }[];
  readonly xTitle: string;
  readonly yTitle: string;
  readonly writeX: (value: number) => string;
  readonly writeY: (value: number) => string;
  readonly alt: string;
}

const PLOT = 240;
const RIGHT = 16;
const LOW = 17;
/** Above all that the library draws. */
const ABOVE = 3_000;

export function Stack({ x, layers, writeX, writeY, ...props }: StackProps) {
  const [box, width] = useWidth<HTMLDivElement>(560);
  const chart = useId();
  const y = exactAxis(0, 1, 6);
  const left = numbersWidth(y.ticks, writeY);
  const across = exactAxis(x[0] ?? 0, x.at(-1) ?? 1, Math.max(2, Math.floor(width / 90)));
  const room = width - left - RIGHT;
  const fills = layers.map((layer, index) => ({ ...layer, fill: hatchFill(chart, index) }));
  const places = layers.map((_, index) => labelPlace(layers, index, room));
  const key = keyRows(
    fills.filter((_, index) => places[index] === null),
    width,
  );
  const rows = x.map((at, index) => ({
    x: at,
    ...Object.fromEntries(layers.map(({ id, values }) => [`layer-${id}`, values[index]])),
  }));
  return (
    <div ref={box} role="img" aria-label={props.alt}>
      <AreaChart
        width={width}
        height={TOP + PLOT + BOTTOM + key.height}
        data={rows}
        margin={{ top: TOP, right: RIGHT, bottom: BOTTOM + key.height - 30, left: 0 }}
        accessibilityLayer={false}
      >
        <Hatches chart={chart} count={layers.length} />
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
          domain={[0, 1]}
          ticks={[...y.ticks]}
          tickFormatter={(tick: number) => writeY(tick)}
          interval={0}
          tick={TICK}
          axisLine={false}
          tickLine={false}
        />
        {fills.map(({ id, name, fill }) => (
          <Area
            key={id}
            dataKey={`layer-${id}`}
            name={name}
            stackId="whole"
            type="linear"
            fill={fill}
            fillOpacity={1}
            stroke="var(--paper)"
            strokeWidth={1.5}
            isAnimationActive={false}
            activeDot={false}
          />
        ))}
        <text x={left} y={14} fontSize={TEXT}>
          {props.yTitle}
        </text>
        <text x={width - 2} y={TOP + PLOT + BOTTOM - 4} fontSize={TEXT} textAnchor="end">
          {props.xTitle}
        </text>
        <ZIndexLayer zIndex={ABOVE}>
          {places.map(
            (place, index) =>
              place && (
                <text
                  key={layers[index]?.id}
                  x={left + place.x}
                  y={TOP + place.y + 5}
                  fontSize={TEXT}
                  textAnchor="middle"
                  stroke="var(--paper)"
                  strokeWidth="4"
                  paintOrder="stroke"
                >
                  {layers[index]?.name}
                </text>
              ),
          )}
        </ZIndexLayer>
        <FillKey places={key.places} top={TOP + PLOT + BOTTOM} />
      </AreaChart>
    </div>
  );
}

/** Middle of a layer where it is thickest, in px of the plot; null where its name has no room. */
function labelPlace(layers: StackProps['layers'], index: number, room: number) {
  const { name, values } = layers[index] as StackProps['layers'][number];
  const half = textWidth(name) / 2 + 4;
  const last = values.length - 1;
  const xAt = (at: number) => (last === 0 ? room / 2 : (at / last) * room);
  const fitting = values
    .map((_, at) => at)
    .filter((at) => xAt(at) >= half && xAt(at) <= room - half);
  const first = fitting[0];
  if (first === undefined) return null;
  const at = fitting.reduce((a, b) => ((values[b] ?? 0) > (values[a] ?? 0) ? b : a), first);
  const thick = values[at] ?? 0;
  if (thick * PLOT < LOW) return null;
  const below = layers.slice(0, index).reduce((sum, layer) => sum + (layer.values[at] ?? 0), 0);
  return { x: xAt(at), y: (1 - below - thick / 2) * PLOT };
}
