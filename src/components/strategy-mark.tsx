/**
 * How a strategy is told apart: a colour of the palette in its fixed order, and its own
 * dash and marker, so that a chart reads without colour.
 */

export interface StrategyMark {
  readonly color: string;
  /** SVG dash array; empty for a whole line. */
  readonly dash: string;
  readonly marker: string;
}

const COLORS = 8;
const DASHES = ['', '24 2.5', '12 2.5', '24 2.5 5 2.5', '6 2.5', '24 2.5 5 2.5 5 2.5'];
/** Paths about the origin, of like weight to the eye. */
const MARKERS = [
  'M-6.5 0 A6.5 6.5 0 1 1 6.5 0 A6.5 6.5 0 1 1 -6.5 0 Z',
  'M-5.8 -5.8 H5.8 V5.8 H-5.8 Z',
  'M0 -8 L8 0 L0 8 L-8 0 Z',
  'M0 -7.5 L7.5 6 H-7.5 Z',
  'M0 7.5 L7.5 -6 H-7.5 Z',
  'M-2.4 -7 H2.4 V-2.4 H7 V2.4 H2.4 V7 H-2.4 V2.4 H-7 V-2.4 H-2.4 Z',
  'M-3.3 -7.5 H3.3 L7.5 0 L3.3 7.5 H-3.3 L-7.5 0 Z',
];

/** @param index place of the strategy in its document. */
export function strategyMark(index: number): StrategyMark {
  return {
    color: `var(--s${(index % COLORS) + 1})`,
    dash: DASHES[index % DASHES.length] as string,
    marker: MARKERS[index % MARKERS.length] as string,
  };
}

/** The mark beside a strategy's name in a table or a key. */
export function Swatch({ index }: { index: number }) {
  const { color, dash, marker } = strategyMark(index);
  return (
    <svg
      width="34"
      height="16"
      viewBox="0 0 34 16"
      className="inline-block shrink-0"
      aria-hidden="true"
    >
      <line x1="1" x2="33" y1="8" y2="8" stroke={color} strokeWidth="4" strokeDasharray={dash} />
      <path
        d={marker}
        transform="translate(17 8) scale(0.85)"
        fill={color}
        stroke="var(--paper)"
        strokeWidth="1.5"
      />
    </svg>
  );
}
