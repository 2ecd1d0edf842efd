/** The graduation of the arm: where it ends, how far one step goes, where the ticks are. */

export interface BeamScale {
  /** Largest threshold on the arm, money per unit of health. */
  readonly max: number;
  /** What one press of an arrow key moves. */
  readonly step: number;
}

/**
 * An arm that holds every policy threshold and every corner of the frontier within reach,
 * with room beyond; a corner far off does not squeeze the rest.
 * @param thresholds policy thresholds, 0 or more
 * @param corners ICERs along the frontier
 */
export function beamScale(thresholds: readonly number[], corners: readonly number[]): BeamScale {
  const highest = Math.max(...thresholds, 0);
  const limit = highest > 0 ? 3 * highest : Number.POSITIVE_INFINITY;
  const within = corners.filter((corner) => corner <= limit);
  const reach = 1.15 * Math.max(highest, ...within, 0);
  const max = niceAbove(reach > 0 ? reach : 1);
  return { max, step: niceBelow(max / 60) };
}

/** Threshold after `steps` presses: onto the next graduation, then from one to the next. */
export function stepFrom(value: number, steps: number, { max, step }: BeamScale): number {
  const places = value / step;
  const whole = Math.abs(places - Math.round(places)) < 1e-6;
  const from = whole ? Math.round(places) : steps > 0 ? Math.floor(places) : Math.ceil(places);
  return tidy(Math.min(max, Math.max(0, (from + steps) * step)));
}

/** The nearest point that a drag may rest on: a notch close by, else a fifth of a step. */
export function settle(
  value: number,
  notches: readonly number[],
  near: number,
  scale: BeamScale,
): number {
  const bounded = Math.min(scale.max, Math.max(0, value));
  const notch = notches.find((each) => Math.abs(each - bounded) <= near);
  if (notch !== undefined) return notch;
  const grain = scale.step / 5;
  return tidy(Math.round(bounded / grain) * grain);
}

/** Distance between labelled ticks so that each label has its room. */
export function majorStep(max: number, room: number, labelWidth: number): number {
  const apart = Math.min(44, room / 12);
  const most = Math.max(1, Math.floor(room / (labelWidth + apart)));
  return niceAbove(max / most, [1, 2, 2.5, 5, 10]);
}

export function ticks(max: number, step: number): number[] {
  const count = Math.floor(max / step + 1e-9);
  return Array.from({ length: count + 1 }, (_, i) => tidy(i * step));
}

function niceAbove(value: number, steps = [1, 1.2, 1.5, 2, 2.5, 3, 3.5, 4, 5, 6, 8, 10]): number {
  const power = 10 ** Math.floor(Math.log10(value));
  const step = steps.find((each) => each * power >= value * (1 - 1e-9)) ?? 10;
  return tidy(step * power);
}

function niceBelow(value: number): number {
  const power = 10 ** Math.floor(Math.log10(value));
  const step = [5, 2, 1].find((each) => each * power <= value * (1 + 1e-9)) ?? 1;
  return tidy(step * power);
}

/** Takes back what binary fractions leave behind, so that 0.1 x 3 reads 0.3. */
function tidy(value: number): number {
  return Number(value.toPrecision(12));
}
