/** The beam as a picture: what the slider and the printed page both show. */
import type { TFunction } from 'i18next';
import { useTranslation } from 'react-i18next';
import type { FrontierSegment } from '../../../shared/analysis/frontier-segments.ts';
import type { Lever, WeighedPair } from '../../../shared/analysis/lever.ts';
import { textWidth } from '../../components/text-width.ts';
import { formatAmount, formatOutcome } from '../../i18n/format.ts';
import type { Language } from '../../store/settings.ts';
import { Arm, type Notch } from './arm.tsx';
import { Hook, LevelMark, Poise, Stand } from './hanging.tsx';
import { type BeamLayout, beamLayout, FOOT, keepInside, STAND } from './layout.ts';
import type { BeamScale } from './scale.ts';

export interface BeamLook {
  readonly scale: BeamScale;
  /** Where the poise stands: money per unit of health. */
  readonly threshold: number;
  readonly segments: readonly FrontierSegment[];
  readonly notches: readonly Notch[];
  readonly lever: Lever;
  readonly pair: WeighedPair;
  /** Strategies by id, in document order. */
  readonly names: ReadonlyMap<string, string>;
  /** The threshold in words, such as "KM 1,500 per QALY". */
  readonly wordFor: (threshold: number) => string;
  readonly language: Language;
}

/** A load's word and amount, and how wide the plate is that holds them. */
interface Plate {
  readonly word: string;
  readonly amount: string;
  readonly width: number;
}

export interface BeamDrawing {
  readonly layout: BeamLayout;
  readonly hook: Plate;
  readonly poise: Plate;
  /** Degrees that the arm leans towards the poise. */
  readonly angle: number;
  /** Where the words under the poise stand: they go down with it. */
  readonly footY: number;
}

/**
 * @param width px that the picture is laid out in
 * @param drop px that the arm's far end may sink, where it is not the usual
 */
export function drawBeam(look: BeamLook, width: number, t: TFunction, drop?: number): BeamDrawing {
  const { scale, segments, lever, pair, names, language } = look;
  const hook = plate(
    t(`beam.plate.${lever.hook === 'lift' ? 'saved' : 'cost'}`),
    amountOnHook(pair.incrementalCost, language),
  );
  const poise = plate(
    t(`beam.plate.${lever.poise === 'loss' ? 'healthLost' : 'health'}`),
    amountOnPoise(pair.incrementalHealth, language),
  );
  const layout = beamLayout(width, scale.max, segments, names, {
    plate: { width: hook.width, lifts: lever.hook === 'lift' },
    poiseWidth: poise.width,
    ...(drop === undefined ? {} : { drop }),
  });
  const angle = lever.tilt * layout.maxAngle;
  const reach = layout.xOf(look.threshold) - layout.fulcrum.x;
  const footY = layout.fulcrum.y + FOOT + reach * Math.sin((angle * Math.PI) / 180);
  return { layout, hook, poise, angle, footY };
}

interface BeamPictureProps extends BeamLook {
  readonly drawing: BeamDrawing;
  /** Classes of what turns and slides; none where it follows a finger or stands still. */
  readonly moving: string;
}

/** The parts of the picture, to be put into an SVG of the layout's width and height. */
export function BeamPicture(props: BeamPictureProps) {
  const { scale, threshold, segments, notches, lever, names, language, drawing, moving } = props;
  const { t } = useTranslation();
  const { layout, hook, poise, angle, footY } = drawing;
  const { fulcrum, width } = layout;
  const turn = {
    transform: `rotate(${angle}deg)`,
    transformOrigin: `${fulcrum.x}px ${fulcrum.y}px`,
  };
  const level = lever.levelAt !== null && lever.levelAt <= scale.max ? lever.levelAt : null;
  const foot = props.wordFor(threshold);
  const hang = { layout, moving, angle };
  return (
    <>
      <Stand x={fulcrum.x} y={fulcrum.y} bottom={fulcrum.y + STAND} />
      <g className={moving} style={turn}>
        <Arm
          layout={layout}
          max={scale.max}
          segments={segments}
          notches={notches}
          names={names}
          threshold={threshold}
          format={(value) => formatAmount(value, language)}
        />
        {level !== null && (
          <LevelMark
            layout={layout}
            x={layout.xOf(level)}
            words={t('beam.levelAt', { threshold: formatAmount(level, language) })}
          />
        )}
        <Hook {...hang} {...hook} way={lever.hook} />
        <Poise {...hang} {...poise} x={layout.xOf(threshold)} loss={lever.poise === 'loss'} />
      </g>
      <text
        x={keepInside(layout.xOf(threshold), textWidth(foot, 16, true), width)}
        y={footY}
        textAnchor="middle"
        fontSize="16"
        fontWeight="700"
      >
        {foot}
      </text>
    </>
  );
}

/** What is saved or lost is said by the word above it: its amount bears no sign. */
function amountOnHook(cost: number, language: Language): string {
  const amount = formatAmount(Math.abs(cost), language);
  return cost > 0 ? `+${amount}` : amount;
}

function amountOnPoise(health: number, language: Language): string {
  return formatOutcome(Math.abs(health), language, health > 0);
}

function plate(word: string, amount: string): Plate {
  const width = Math.max(56, textWidth(word, 14), textWidth(amount, 14, true)) + 16;
  return { word, amount, width };
}
