/** A QR code (ISO/IEC 18004) of a text, drawn as one path. */
import { create } from 'qrcode';

/** Modules of white that the standard asks for on every side. */
const QUIET = 4;

export function QrCode({ text, label }: { text: string; label: string }) {
  const { modules } = create(text, { errorCorrectionLevel: 'M' });
  const { size } = modules;
  const whole = size + 2 * QUIET;
  let path = '';
  for (let y = 0; y < size; y += 1) {
    for (let x = 0; x < size; x += 1) {
      if (modules.get(y, x)) path += `M${x + QUIET} ${y + QUIET}h1v1h-1z`;
    }
  }
  return (
    <svg
      viewBox={`0 0 ${whole} ${whole}`}
      shapeRendering="crispEdges"
      role="img"
      aria-label={label}
      className="size-full"
    >
      <rect width={whole} height={whole} fill="#fff" />
      <path d={path} fill="#000" />
    </svg>
  );
}
