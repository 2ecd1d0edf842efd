/**
 * The steelyard itself. On the hook hangs what the strategy costs more than the one it is
 * weighed against, on the poise the health it adds; the poise's distance from the stand is
 * the threshold. The arm obeys shared/analysis/lever.ts.
 */
import { type KeyboardEvent, type PointerEvent, useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { FrontierSegment } from '../../../shared/analysis/frontier-segments.ts';
import type { Lever, WeighedPair } from '../../../shared/analysis/lever.ts';
import type { Move } from '../../components/move.ts';
import { textWidth } from '../../components/text-width.ts';
import { useWidth } from '../../components/use-width.ts';
import { formatAmount, formatOutcome } from '../../i18n/format.ts';
import type { Language } from '../../store/settings.ts';
import { Arm, type Notch } from './arm.tsx';
import { BeamKey } from './beam-key.tsx';
import { Hook, LevelMark, Poise, Stand } from './hanging.tsx';
import { keyMove } from './keys.ts';
import { beamLayout, FOOT, keepInside, STAND } from './layout.ts';
import { type BeamScale, settle } from './scale.ts';

export interface BeamProps {
  readonly scale: BeamScale;
  /** Where the poise stands: money per unit of health. */
  readonly threshold: number;
  readonly segments: readonly FrontierSegment[];
  /** The same over all thresholds, beyond the arm's end too. */
  readonly ranges: readonly FrontierSegment[];
  readonly notches: readonly Notch[];
  readonly lever: Lever;
  readonly pair: WeighedPair;
  /** Strategies by id, in document order. */
  readonly names: ReadonlyMap<string, string>;
  /** The threshold in words, such as "KM 1,500 per QALY". */
  readonly wordFor: (threshold: number) => string;
  /** Name of the strategy that is best at the poise. */
  readonly best: string;
  readonly onMove: (move: Move) => void;
  readonly language: Language;
  readonly moneyFor: (amount: number) => string;
}

const FIRST_WIDTH = 720;

export function Beam(props: BeamProps) {
  const { scale, threshold, segments, notches, lever, pair, names, language, onMove } = props;
  const { t } = useTranslation();
  const [box, width] = useWidth<HTMLDivElement>(FIRST_WIDTH);
  const [dragging, setDragging] = useState(false);
  const cost = amountOnHook(pair.incrementalCost, language);
  const health = amountOnPoise(pair.incrementalHealth, language);
  const hookWord = t(`beam.plate.${lever.hook === 'lift' ? 'saved' : 'cost'}`);
  const poiseWord = t(`beam.plate.${lever.poise === 'loss' ? 'healthLost' : 'health'}`);
  const poiseWidth = plate(poiseWord, health);
  const plateWidth = plate(hookWord, cost);
  const layout = beamLayout(width, scale.max, segments, names, {
    plate: { width: plateWidth, lifts: lever.hook === 'lift' },
    poiseWidth,
  });
  const { fulcrum, height, maxAngle } = layout;
  const angle = lever.tilt * maxAngle;
  const moving = dragging ? '' : 'motion-safe:transition-transform motion-safe:duration-200';
  const turn = {
    transform: `rotate(${angle}deg)`,
    transformOrigin: `${fulcrum.x}px ${fulcrum.y}px`,
  };
  const hang = { moving, angle };
  const level = lever.levelAt !== null && lever.levelAt <= scale.max ? lever.levelAt : null;
  const foot = props.wordFor(threshold);
  const reach = layout.xOf(threshold) - fulcrum.x;
  const footY = fulcrum.y + FOOT + reach * Math.sin((angle * Math.PI) / 180);
  const onKeyDown = (event: KeyboardEvent) => {
    const move = keyMove(event.nativeEvent, threshold, scale);
    if (move === null) return;
    event.preventDefault();
    onMove(move);
  };
  const drag = useDrag({ layout, scale, notches, onMove, setDragging });

  return (
    <div ref={box} className="min-w-0">
      <div
        role="slider"
        tabIndex={0}
        aria-label={t('beam.slider')}
        aria-orientation="horizontal"
        aria-valuemin={0}
        aria-valuemax={scale.max}
        aria-valuenow={Math.min(threshold, scale.max)}
        aria-valuetext={t('beam.value', { threshold: foot, strategy: props.best })}
        onKeyDown={onKeyDown}
        className="group cursor-grab touch-pan-y outline-none select-none active:cursor-grabbing"
        {...drag}
      >
        <svg
          width={width}
          height={height}
          viewBox={`0 0 ${width} ${height}`}
          className="block max-w-full"
          aria-hidden="true"
        >
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
            <Hook
              layout={layout}
              {...hang}
              way={lever.hook}
              word={hookWord}
              amount={cost}
              width={plateWidth}
            />
            <Poise
              layout={layout}
              {...hang}
              x={layout.xOf(threshold)}
              loss={lever.poise === 'loss'}
              word={poiseWord}
              amount={health}
              width={poiseWidth}
            />
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
        </svg>
      </div>
      {!layout.namesFit && <BeamKey {...props} />}
    </div>
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

/** Width of a plate that holds a word and an amount. */
function plate(word: string, amount: string): number {
  return Math.max(56, textWidth(word, 14), textWidth(amount, 14, true)) + 16;
}

interface DragOptions {
  readonly layout: ReturnType<typeof beamLayout>;
  readonly scale: BeamScale;
  readonly notches: readonly Notch[];
  readonly onMove: (move: Move) => void;
  readonly setDragging: (dragging: boolean) => void;
}

/** Pixels within which a notch catches the poise. */
const CATCH = 5;

/** Mouse, pen and touch: the poise comes to where the arm is pressed, and follows. */
function useDrag({ layout, scale, notches, onMove, setDragging }: DragOptions) {
  const place = (event: PointerEvent<HTMLElement>) => {
    const x = event.clientX - event.currentTarget.getBoundingClientRect().left;
    const near = layout.thresholdAt(layout.fulcrum.x + CATCH);
    const values = notches.map((notch) => notch.value);
    return settle(layout.thresholdAt(x), values, near, scale);
  };
  const isDown = (event: PointerEvent<HTMLElement>) =>
    event.currentTarget.hasPointerCapture(event.pointerId);
  return {
    onPointerDown: (event: PointerEvent<HTMLElement>) => {
      if (event.button !== 0) return;
      event.currentTarget.setPointerCapture(event.pointerId);
      event.currentTarget.focus({ preventScroll: true });
      setDragging(true);
      onMove({ to: place(event), starts: true });
    },
    onPointerMove: (event: PointerEvent<HTMLElement>) => {
      if (isDown(event)) onMove({ to: place(event), starts: false });
    },
    onPointerUp: () => setDragging(false),
    onPointerCancel: () => setDragging(false),
  };
}
