import { cycleCount, exactCycles, isWholeCycles } from '../cycles.ts';
import type { Question } from '../document.ts';
import { error, type Issue, type Path, warning } from '../issue.ts';
import { MAX_CYCLES } from '../limits.ts';
import type { Lookups } from './lookups.ts';
import { checkStrategy } from './references-of.ts';

/** The comparator is a strategy, the threshold in force is listed, and the clock can be run. */
export function checkQuestion(lookups: Lookups): Issue[] {
  const { question } = lookups.document;
  return [
    ...checkStrategy(lookups, question.comparator, ['question', 'comparator']),
    ...checkThresholdInForce(question),
    ...checkClock(question, ['question', 'horizon']),
  ];
}

function checkThresholdInForce({ thresholds, thresholdInForce: id }: Question): Issue[] {
  if (id === undefined || thresholds.some((threshold) => threshold.id === id)) return [];
  return [error('question.unknownThreshold', ['question', 'thresholdInForce'], { id })];
}

/**
 * At most MAX_CYCLES cycles; an even number of them under Simpson's 1/3 rule, which
 * takes them in pairs; a horizon that is no whole number of cycles is rounded, and
 * said. `path` is where the horizon was set.
 */
export function checkClock(question: Question, path: Path): Issue[] {
  const count = cycleCount(question);
  if (count > MAX_CYCLES) {
    return [error('question.tooManyCycles', path, { cycles: count, maximum: MAX_CYCLES })];
  }
  const issues: Issue[] = [];
  if (!isWholeCycles(question)) {
    const params = { cycles: count, exact: exactCycles(question) };
    issues.push(warning('question.cyclesRounded', path, params));
  }
  if (question.counting === 'simpson' && count % 2 === 1) {
    issues.push(error('question.simpsonNeedsEvenCycles', path, { cycles: count }));
  }
  return issues;
}
