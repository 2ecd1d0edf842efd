import { cycleCount } from '../cycles.ts';
import { error, type Issue } from '../issue.ts';
import { MAX_WORK } from '../limits.ts';
import type { Lookups } from './lookups.ts';
import { expandedStates } from './states.ts';

/** One run's work, strategies x profiles x cycles x expanded states, is within MAX_WORK. */
export function checkSize({ document }: Lookups): Issue[] {
  const { strategies, profiles, question, states } = document;
  const work = strategies.length * profiles.length * cycleCount(question) * expandedStates(states);
  return work <= MAX_WORK ? [] : [error('document.tooMuchWork', [], { work, maximum: MAX_WORK })];
}
