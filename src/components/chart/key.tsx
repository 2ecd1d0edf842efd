/** What the colours, dashes and hatches of a chart stand for, within its picture. */
import type { StrategyMark } from '../strategy-mark.tsx';
import { KEY_LINE, type KeyPlace, TEXT } from './layout.ts';

interface LineKeyItem {
  readonly name: string;
  readonly mark: StrategyMark;
  readonly under?: boolean;
}

export function LineKey(props: { places: readonly KeyPlace<LineKeyItem>[]; top: number }) {
  return props.places.map(({ item, x, y }) => (
    <g key={item.name} transform={`translate(${x} ${props.top + y})`}>
      <line
        x1="0"
        x2="34"
        y1={KEY_LINE / 2}
        y2={KEY_LINE / 2}
        stroke={item.mark.color}
        strokeWidth={item.under ? 8 : 2.5}
        strokeDasharray={item.mark.dash}
      />
      {!item.under && <Marker mark={item.mark} x={17} y={KEY_LINE / 2} />}
      <text x="42" y={KEY_LINE / 2 + 5} fontSize={TEXT}>
        {item.name}
      </text>
    </g>
  ));
}

export function FillKey(props: {
  places: readonly KeyPlace<{ readonly name: string; readonly fill: string }>[];
  top: number;
}) {
  return props.places.map(({ item, x, y }) => (
    <g key={item.name} transform={`translate(${x} ${props.top + y})`}>
      <rect width="34" height="16" y={KEY_LINE / 2 - 8} fill={item.fill} stroke="var(--ink)" />
      <text x="42" y={KEY_LINE / 2 + 5} fontSize={TEXT}>
        {item.name}
      </text>
    </g>
  ));
}

export function Marker({ mark, x, y }: { mark: StrategyMark; x: number; y: number }) {
  return (
    <path
      d={mark.marker}
      transform={`translate(${x} ${y}) scale(0.8)`}
      fill={mark.color}
      stroke="var(--paper)"
      strokeWidth="1.5"
    />
  );
}
