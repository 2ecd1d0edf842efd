/** The beam standing still, for a page that is read or printed. */
import { useTranslation } from 'react-i18next';
import type { FrontierSegment } from '../../../shared/analysis/frontier-segments.ts';
import { useWidth } from '../../components/use-width.ts';
import { BeamKey } from './beam-key.tsx';
import { STAND } from './layout.ts';
import { type BeamLook, BeamPicture, drawBeam } from './picture.tsx';

interface StaticBeamProps extends BeamLook {
  /** What it shows, in words. */
  readonly label: string;
  /** Over all thresholds, for the names that find no room along the arm. */
  readonly ranges: readonly FrontierSegment[];
  readonly moneyFor: (amount: number) => string;
  /** px that it is laid out in, whatever room there is: the picture is scaled to it. */
  readonly width?: number;
  readonly className?: string;
}

const FIRST_WIDTH = 640;
/** A still arm need not show small movements, and a page has little height. */
const DROP = 26;

export function StaticBeam({ label, width: given, className = '', ...look }: StaticBeamProps) {
  const { t } = useTranslation();
  const [box, measured] = useWidth<HTMLDivElement>(FIRST_WIDTH);
  const drawing = drawBeam(look, given ?? measured, t, DROP);
  const { width, fulcrum, namesFit } = drawing.layout;
  // It never moves: no room is kept for where it might lean.
  const height = Math.max(drawing.footY, fulcrum.y + STAND) + 6;
  return (
    <div ref={box} className={`min-w-0 ${className}`}>
      <svg
        viewBox={`0 0 ${width} ${height}`}
        className="block w-full"
        role="img"
        aria-label={label}
      >
        <BeamPicture {...look} drawing={drawing} moving="" />
      </svg>
      {!namesFit && <BeamKey {...look} />}
    </div>
  );
}
