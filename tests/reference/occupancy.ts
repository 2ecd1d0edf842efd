/** Shares of the cohort by sub-state at every boundary, and who moved between them. */
import { evaluate, type Setting } from './evaluate.ts';
import type { Matrix } from './matrix.ts';
import { movementMatrix, type SubState, subStates } from './movement.ts';

export interface Occupancy {
  readonly places: readonly SubState[];
  /** Row k: share of the cohort in each place at boundary k = 0..N. */
  readonly shares: readonly (readonly number[])[];
  /** Element c: share of the cohort that moves from place i to place j in cycle c. */
  readonly flows: readonly Matrix[];
}

export function cycles(setting: Setting): number {
  const { horizon, cycleLength } = setting.document.question;
  return Math.round(horizon / cycleLength);
}

export function occupancy(setting: Setting): Occupancy {
  return setting.document.movements.type === 'survival' ? partitioned(setting) : moved(setting);
}

function moved(setting: Setting): Occupancy {
  const places = subStates(setting.document);
  let here = startShares(setting, places);
  const shares = [here];
  const flows: Matrix[] = [];
  for (let cycle = 0; cycle < cycles(setting); cycle++) {
    const chances = movementMatrix(setting, cycle);
    const flow = chances.map((row, i) => row.map((p) => p * (here[i] as number)));
    here = places.map((_, j) => flow.reduce((sum, row) => sum + (row[j] as number), 0));
    flows.push(flow);
    shares.push(here);
  }
  return { places, shares, flows };
}

/** Everybody enters a timed state by its first tunnel. */
function startShares(setting: Setting, places: readonly SubState[]): number[] {
  const { shares, remainder } = setting.document.start;
  const byState = new Map<string, number>();
  let rest = 1;
  for (const share of shares) {
    const value = evaluate(share.formula, setting, { cycle: 0, tunnel: 0 });
    byState.set(share.state, (byState.get(share.state) ?? 0) + value);
    rest -= value;
  }
  byState.set(remainder, (byState.get(remainder) ?? 0) + rest);
  return places.map(({ state, tunnel }) => (tunnel === 0 ? (byState.get(state) ?? 0) : 0));
}

function partitioned(setting: Setting): Occupancy {
  const { movements } = setting.document;
  if (movements.type !== 'survival') throw new Error('this model moves by rows');
  const places = subStates(setting.document);
  const shares = Array.from({ length: cycles(setting) + 1 }, (_, cycle) => {
    const byState = new Map<string, number>();
    let above = 0;
    for (const curve of movements.curves) {
      const alive = evaluate(curve.formula, setting, { cycle, tunnel: 0 });
      byState.set(curve.state, alive - above);
      above = alive;
    }
    byState.set(movements.last, 1 - above);
    return places.map(({ state }) => byState.get(state) ?? 0);
  });
  return { places, shares, flows: [] };
}
