/** The substates whose occupancy matters to some sum, at once or through a later move. */
import type { StrategyAccounts } from './accounts.ts';
import type { CohortPlan } from './compile.ts';

/** A dead end that earns nothing (usually the dead) need not be followed. */
export function followedSubstates(plan: CohortPlan, accounts: StrategyAccounts): Int32Array {
  const bookings = [...accounts.steady, ...accounts.varying];
  const followed = new Set(bookings.map(({ substate }) => substate));
  const moves = plan.moves ?? [];
  for (let before = -1; before !== followed.size; ) {
    before = followed.size;
    for (const { from, to } of moves) if (followed.has(to)) followed.add(from);
  }
  return Int32Array.from([...followed].sort((a, b) => a - b));
}
