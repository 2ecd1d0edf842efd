import type { Question } from './document.ts';

/** The threshold in force: money per unit of the primary outcome. */
export function thresholdInForce(question: Question): number {
  const { thresholds, thresholdInForce: id } = question;
  return (thresholds.find((threshold) => threshold.id === id) ?? thresholds[0])?.value ?? 0;
}
