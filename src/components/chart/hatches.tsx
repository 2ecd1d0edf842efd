/**
 * Fills that are told apart in grey too: a colour of the palette, and over it a hatch that
 * changes from one part to the next.
 */
const COLORS = 8;
const HATCHES = [
  '',
  'M-2 10 L10 -2',
  'M-2 -2 L10 10',
  'M4 0 V8 M0 4 H8',
  'M0 4 H8',
  'M4 0 V8',
] as const;

/** @param chart an id of the chart, so that two on a page keep theirs apart. */
export function hatchFill(chart: string, index: number): string {
  return `url(#${idOf(chart, index)})`;
}

export function Hatches({ chart, count }: { chart: string; count: number }) {
  return (
    <defs>
      {Array.from({ length: count }, (_, index) => (
        <pattern
          key={idOf(chart, index)}
          id={idOf(chart, index)}
          width="8"
          height="8"
          patternUnits="userSpaceOnUse"
        >
          <rect width="8" height="8" fill={`var(--s${(index % COLORS) + 1})`} />
          <path d={HATCHES[index % HATCHES.length]} stroke="var(--paper)" strokeWidth="1.4" />
        </pattern>
      ))}
    </defs>
  );
}

function idOf(chart: string, index: number): string {
  return `hatch-${chart.replaceAll(/[^\w-]/g, '')}-${index}`;
}
