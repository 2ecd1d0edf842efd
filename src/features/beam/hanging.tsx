/** What hangs on the arm, what it hangs from, and the mark where it lies level. */
import { textWidth } from '../../components/text-width.ts';
import {
  type BeamLayout,
  HOOK_DROP,
  keepInside,
  LIFT_RISE,
  PLATE_HEIGHT,
  POISE_DROP,
  POISE_FLARE,
  POISE_HEIGHT,
} from './layout.ts';

/** What hangs stays upright while the arm turns: it turns back by the same angle. */
interface Hanging {
  readonly layout: BeamLayout;
  readonly angle: number;
  readonly moving: string;
  readonly word: string;
  readonly amount: string;
  readonly width: number;
}

export function Stand({ x, y, bottom }: { x: number; y: number; bottom: number }) {
  return (
    <g stroke="var(--ink)" fill="none" strokeLinejoin="round">
      <path d={`M${x - 15} ${bottom} L${x} ${y} L${x + 15} ${bottom}`} strokeWidth="2.2" />
      <path d={`M${x - 26} ${bottom} H${x + 26}`} strokeWidth="3" strokeLinecap="round" />
    </g>
  );
}

/** A load hangs below the arm; a saving lifts, and is drawn above it. */
export function Hook(props: Hanging & { readonly way: 'load' | 'lift' | 'nothing' }) {
  const { layout, angle, moving, word, amount, width, way } = props;
  const lifts = way === 'lift';
  const top = lifts ? -LIFT_RISE : HOOK_DROP;
  const color = lifts ? 'var(--gain)' : 'var(--clay)';
  return (
    <g transform={`translate(${layout.hookX} ${layout.fulcrum.y})`}>
      <g className={moving} style={{ transform: `rotate(${-angle}deg)` }}>
        <line y1="0" y2={lifts ? top + PLATE_HEIGHT : top} stroke="var(--ink)" strokeWidth="1.8" />
        {lifts && <path d={`M-7 ${top + 1} L0 ${top - 8} L7 ${top + 1} Z`} fill={color} />}
        <rect x={-width / 2} y={top} width={width} height={PLATE_HEIGHT} rx="4" fill={color} />
        <PlateText top={top} word={word} amount={amount} color="var(--paper)" />
      </g>
    </g>
  );
}

interface PoiseProps extends Hanging {
  readonly x: number;
  /** Health lost is drawn hollow, with an arrow that lifts. */
  readonly loss: boolean;
}

export function Poise({ layout, angle, moving, x, loss, word, amount, width }: PoiseProps) {
  const half = width / 2;
  const top = POISE_DROP;
  const shape = `M${-half} ${top} H${half} L${half + POISE_FLARE} ${top + POISE_HEIGHT - 8} Q0 ${top + POISE_HEIGHT + 8} ${-half - POISE_FLARE} ${top + POISE_HEIGHT - 8} Z`;
  return (
    <g className={moving} style={{ transform: `translate(${x}px, ${layout.fulcrum.y}px)` }}>
      <rect x="-6" y="-13" width="12" height="26" rx="2" fill="var(--brass)" />
      <g className={moving} style={{ transform: `rotate(${-angle}deg)` }}>
        <line y1="0" y2={top} stroke="var(--brass)" strokeWidth="2.6" />
        <path
          d={shape}
          fill={loss ? 'var(--paper)' : 'var(--brass)'}
          stroke="var(--brass)"
          strokeWidth="2"
        />
        <path
          d={shape}
          className="hidden group-focus-visible:block"
          transform={`translate(0 ${top + POISE_HEIGHT / 2}) scale(1.16 1.3) translate(0 ${-top - POISE_HEIGHT / 2})`}
          fill="none"
          stroke="var(--ink)"
          strokeWidth="2.5"
        />
        <PlateText
          top={top + 2}
          word={word}
          amount={amount}
          color={loss ? 'var(--ink)' : 'var(--on-brass)'}
        />
      </g>
    </g>
  );
}

interface PlateTextProps {
  readonly top: number;
  readonly word: string;
  readonly amount: string;
  readonly color: string;
}

function PlateText({ top, word, amount, color }: PlateTextProps) {
  return (
    <g textAnchor="middle" fontSize="14">
      <text y={top + 18} style={{ fill: color }}>
        {word}
      </text>
      <text y={top + 36} fontWeight="700" style={{ fill: color }}>
        {amount}
      </text>
    </g>
  );
}

/** Where the arm would lie level: a mark on the edge, its words above everything else. */
export function LevelMark({ layout, x, words }: { layout: BeamLayout; x: number; words: string }) {
  const edge = layout.fulcrum.y - 20;
  const foot = edge - (layout.namesFit ? 26 : 8);
  return (
    <g>
      <line x1={x} x2={x} y1={foot} y2={edge - 6} stroke="var(--ink)" strokeWidth="1.4" />
      <path d={`M${x} ${edge} l6 -9 h-12 Z`} fill="var(--ink)" />
      <text
        x={keepInside(x, textWidth(words, 14, true), layout.width, layout.labelsFrom)}
        y={foot - 5}
        fontSize="14"
        fontWeight="700"
        textAnchor="middle"
      >
        {words}
      </text>
    </g>
  );
}
