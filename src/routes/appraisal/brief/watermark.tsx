/** Across the page, pale enough to read through, and drawn as it must print in any colours. */
export function Watermark({ words }: { words: string }) {
  return (
    <svg viewBox="0 0 200 280" className="sheet-watermark" aria-hidden="true">
      <text
        x="100"
        y="140"
        textAnchor="middle"
        fontSize="34"
        fontWeight="700"
        transform="rotate(-52 100 140)"
      >
        {words}
      </text>
    </svg>
  );
}
