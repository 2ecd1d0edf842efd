/**
 * Where the parts of the beam are, in px, for a given width. Text keeps its size on every
 * screen: it is the arm that gets shorter. Rows from the top: the level mark's words, the
 * strategies' names, the coloured edge, the arm, the ticks' numbers, the load on the hook,
 * the poise, and at the foot what the poise stands for. No two rows overlap, however the
 * arm is tipped.
 */

import type { FrontierSegment } from '../../../shared/analysis/frontier-segments.ts';
import { textWidth } from '../../components/text-width.ts';

export interface BeamLayout {
  readonly width: number;
  readonly height: number;
  /** Where the arm turns; also the threshold 0. */
  readonly fulcrum: { readonly x: number; readonly y: number };
  readonly hookX: number;
  /** Where words above the arm may begin: a load that lifts stands beside them. */
  readonly labelsFrom: number;
  /** Right end of the scale. */
  readonly endX: number;
  /** Degrees by which the arm leans when fully tipped. */
  readonly maxAngle: number;
  /** Whether every strategy's name fits on its own stretch of the edge. */
  readonly namesFit: boolean;
  /** Threshold to px from the left, along a level arm. */
  readonly xOf: (threshold: number) => number;
  readonly thresholdAt: (x: number) => number;
}

export const PLATE_HEIGHT = 46;
export const POISE_HEIGHT = 50;
/** How far below the arm's middle the load and the poise hang. */
export const HOOK_DROP = 34;
export const POISE_DROP = HOOK_DROP + PLATE_HEIGHT + 6;

/** Where the stand ends and where the words under the poise stand, below the arm's middle. */
export const STAND = POISE_DROP + POISE_HEIGHT + 2;
export const FOOT = STAND + 24;
/** How far above the arm's middle the top of a lifting load is. */
export const LIFT_RISE = PLATE_HEIGHT + 22;

/** How much wider the poise is at its foot, on each side. */
export const POISE_FLARE = 7;

const ROW = 20;

export interface Loads {
  /** What hangs on the hook: its width, and whether it lifts. */
  readonly plate: { readonly width: number; readonly lifts: boolean };
  readonly poiseWidth: number;
  /** px that the arm's far end may sink, where it is not the usual. */
  readonly drop?: number;
}

export function beamLayout(
  width: number,
  max: number,
  segments: readonly FrontierSegment[],
  names: ReadonlyMap<string, string>,
  { plate, poiseWidth, drop: given }: Loads,
): BeamLayout {
  const wide = width >= 640;
  const hookX = plate.width / 2 + 2;
  const plateEnd = hookX + plate.width / 2;
  const fulcrumX = plateEnd + (wide ? 28 : 16);
  const endX = width - poiseWidth / 2 - POISE_FLARE - 2;
  const room = endX - fulcrumX;
  const drop = given ?? (wide ? 48 : 26);
  const xOf = (threshold: number) => fulcrumX + (Math.min(threshold, max) / max) * room;
  const namesFit = segments.every(
    ({ strategy, from, to }) => textWidth(names.get(strategy) ?? '') + 6 <= xOf(to) - xOf(from),
  );
  const rows = ROW + (namesFit ? ROW : 0) + 16 + drop;
  const y = plate.lifts ? Math.max(rows, LIFT_RISE + 22) : rows;
  return {
    width,
    height: y + drop + FOOT + 10,
    fulcrum: { x: fulcrumX, y },
    hookX,
    labelsFrom: plate.lifts ? plateEnd + 4 : 0,
    endX,
    maxAngle: (Math.asin(drop / room) * 180) / Math.PI,
    namesFit,
    xOf,
    thresholdAt: (x) => ((x - fulcrumX) / room) * max,
  };
}

/** Middle of a label of the given width that would stand at x, kept within the picture. */
export function keepInside(x: number, labelWidth: number, width: number, from = 0): number {
  return Math.min(width - labelWidth / 2 - 2, Math.max(from + labelWidth / 2 + 2, x));
}
