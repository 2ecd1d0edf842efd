/**
 * The steelyard itself. On the hook hangs what the strategy costs more than the one it is
 * weighed against, on the poise the health it adds; the poise's distance from the stand is
 * the threshold. The arm obeys shared/analysis/lever.ts.
 */
import { type KeyboardEvent, type PointerEvent, useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { FrontierSegment } from '../../../shared/analysis/frontier-segments.ts';
import type { Move } from '../../components/move.ts';
import { useWidth } from '../../components/use-width.ts';
import type { Notch } from './arm.tsx';
import { BeamKey } from './beam-key.tsx';
import { keyMove } from './keys.ts';
import type { BeamLayout } from './layout.ts';
import { type BeamLook, BeamPicture, drawBeam } from './picture.tsx';
import { type BeamScale, settle } from './scale.ts';

export interface BeamProps extends BeamLook {
  /** The segments over all thresholds, beyond the arm's end too. */
  readonly ranges: readonly FrontierSegment[];
  /** Name of the strategy that is best at the poise. */
  readonly best: string;
  readonly onMove: (move: Move) => void;
  readonly moneyFor: (amount: number) => string;
}

const FIRST_WIDTH = 720;

export function Beam(props: BeamProps) {
  const { scale, threshold, notches, onMove } = props;
  const { t } = useTranslation();
  const [box, width] = useWidth<HTMLDivElement>(FIRST_WIDTH);
  const [dragging, setDragging] = useState(false);
  const drawing = drawBeam(props, width, t);
  const { layout } = drawing;
  const moving = dragging ? '' : 'motion-safe:transition-transform motion-safe:duration-200';
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
        aria-valuetext={t('beam.value', {
          threshold: props.wordFor(threshold),
          strategy: props.best,
        })}
        onKeyDown={onKeyDown}
        className="group cursor-grab touch-pan-y outline-none select-none active:cursor-grabbing"
        {...drag}
      >
        <svg
          width={width}
          height={layout.height}
          viewBox={`0 0 ${width} ${layout.height}`}
          className="block max-w-full"
          aria-hidden="true"
        >
          <BeamPicture {...props} drawing={drawing} moving={moving} />
        </svg>
      </div>
      {!layout.namesFit && <BeamKey {...props} />}
    </div>
  );
}

interface DragOptions {
  readonly layout: BeamLayout;
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
