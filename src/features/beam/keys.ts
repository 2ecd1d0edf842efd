/** What the keys of a slider do, after the ARIA Authoring Practices' slider pattern. */
import type { Move } from '../../components/move.ts';
import { type BeamScale, stepFrom } from './scale.ts';

const STEPS: Readonly<Record<string, number>> = {
  ArrowRight: 1,
  ArrowUp: 1,
  ArrowLeft: -1,
  ArrowDown: -1,
  PageUp: 10,
  PageDown: -10,
};

type Press = Pick<KeyboardEvent, 'key' | 'repeat' | 'ctrlKey' | 'metaKey' | 'altKey'>;

/** The move that a key asks for, or null where the key is none of the slider's. */
export function keyMove(
  { key, repeat, ctrlKey, metaKey, altKey }: Press,
  threshold: number,
  scale: BeamScale,
): Move | null {
  if (ctrlKey || metaKey || altKey) return null;
  // A key held down is one movement.
  const starts = !repeat;
  if (key === 'Home') return { to: 0, starts };
  if (key === 'End') return { to: scale.max, starts };
  const steps = STEPS[key];
  return steps === undefined ? null : { to: stepFrom(threshold, steps, scale), starts };
}
