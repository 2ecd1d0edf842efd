/** The beam standing still, for a page that is read or printed. */
import { useTranslation } from 'react-i18next';
import type { FrontierSegment } from '../../../shared/analysis/frontier-segments.ts';
import { useWidth } from '../../components/use-width.ts';
import { BeamKey } from './beam-key.tsx';
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

export function StaticBeam({ label, width: given, className = '', ...look }: StaticBeamProps) {
  const { t } = useTranslation();
  const [box, measured] = useWidth<HTMLDivElement>(FIRST_WIDTH);
  const drawing = drawBeam(look, given ?? measured, t);
  const { width, height, namesFit } = drawing.layout;
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
