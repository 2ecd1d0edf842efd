import type { FrontierSegment } from '../../../shared/analysis/frontier-segments.ts';
import { strategyMark } from '../../components/strategy-mark.tsx';
import { textWidth } from '../../components/text-width.ts';
import type { BeamLayout } from './layout.ts';
import { majorStep, ticks } from './scale.ts';

/** A policy threshold cut into the arm. */
export interface Notch {
  readonly id: string;
  readonly value: number;
}

/** Half the arm's thickness at the stand and at its far end. */
const THICK = 9;
const THIN = 6;
const MINOR_PER_MAJOR = 5;

interface ArmProps {
  readonly layout: BeamLayout;
  readonly max: number;
  readonly segments: readonly FrontierSegment[];
  readonly notches: readonly Notch[];
  readonly names: ReadonlyMap<string, string>;
  readonly threshold: number;
  readonly format: (value: number) => string;
}

/** The arm with its graduation, its notches, and along its edge which strategy is best. */
export function Arm(props: ArmProps) {
  const { layout, notches } = props;
  const { fulcrum, hookX, endX } = layout;
  const { x, y } = fulcrum;
  const left = hookX - 8;
  const right = endX + 10;
  return (
    <g>
      <path
        d={`M${left} ${y - THIN} L${x} ${y - THICK} L${right} ${y - THIN} V${y + THIN} L${x} ${y + THICK} L${left} ${y + THIN} Z`}
        fill="var(--raised)"
        stroke="var(--ink)"
        strokeWidth="1.8"
        strokeLinejoin="round"
      />
      <Graduation {...props} />
      {notches.map(({ id, value }) => (
        <path
          key={id}
          d={`M${layout.xOf(value) - 5} ${y + THICK} L${layout.xOf(value)} ${y - 1} L${layout.xOf(value) + 5} ${y + THICK} Z`}
          fill="var(--paper)"
          stroke="var(--ink)"
          strokeWidth="1.5"
          strokeLinejoin="round"
        />
      ))}
      <circle cx={x} cy={y} r="3.2" fill="var(--ink)" />
      <Edge {...props} />
    </g>
  );
}

function Graduation({ layout, max, threshold, format }: ArmProps) {
  const { fulcrum, endX } = layout;
  const y = fulcrum.y;
  const labelWidth = textWidth(format(max));
  const major = majorStep(max, endX - fulcrum.x, labelWidth);
  const poise = layout.xOf(threshold);
  // The poise hangs through the row of numbers: the one behind it steps aside.
  const clear = (x: number) => Math.abs(x - poise) > labelWidth / 2 + 10;
  // The number at the stand would lie on it.
  const shown = (value: number) => value > 0 && clear(layout.xOf(value));
  return (
    <>
      {ticks(max, major / MINOR_PER_MAJOR).map((value) => (
        <line
          key={value}
          x1={layout.xOf(value)}
          x2={layout.xOf(value)}
          y1={y + 2}
          y2={y + THIN}
          stroke="var(--mute)"
          strokeWidth="1"
        />
      ))}
      {ticks(max, major).map((value) => (
        <g key={value}>
          <line
            x1={layout.xOf(value)}
            x2={layout.xOf(value)}
            y1={y - 2}
            y2={y + THIN + 1}
            stroke="var(--ink)"
            strokeWidth="1.6"
          />
          {shown(value) && (
            <text
              x={Math.min(layout.xOf(value), layout.width - labelWidth / 2 - 2)}
              y={y + 27}
              fontSize="14"
              textAnchor="middle"
              className="fill-mute"
            >
              {format(value)}
            </text>
          )}
        </g>
      ))}
    </>
  );
}

function Edge({ layout, segments, names }: ArmProps) {
  const order = [...names.keys()];
  const y = layout.fulcrum.y - THICK - 6;
  return (
    <>
      {segments.map(({ strategy, from, to }) => {
        const { color, dash } = strategyMark(order.indexOf(strategy));
        const [x1, x2] = [layout.xOf(from), layout.xOf(to)];
        return (
          <g key={strategy}>
            <line
              x1={x1}
              x2={x2}
              y1={y}
              y2={y}
              stroke={color}
              strokeWidth="7"
              strokeDasharray={dash}
            />
            {layout.namesFit && (
              <text x={(x1 + x2) / 2} y={y - 10} fontSize="14" textAnchor="middle">
                {names.get(strategy)}
              </text>
            )}
          </g>
        );
      })}
    </>
  );
}
