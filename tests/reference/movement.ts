/** Movements of one cycle, as a matrix over sub-states (the tunnels of timed states). */
import type { ModelDocument, Row } from '../../shared/model/document.ts';
import { evaluate, type Moment, type Setting } from './evaluate.ts';
import { exponentialRow, type Matrix, zeros } from './matrix.ts';

/** A tunnel of a timed state; ordinary and absorbing states have tunnel 0 only. */
export interface SubState {
  readonly state: string;
  readonly tunnel: number;
}

export function subStates(document: ModelDocument): SubState[] {
  return document.states.flatMap((state) =>
    Array.from({ length: tunnels(document, state.id) }, (_, tunnel) => ({
      state: state.id,
      tunnel,
    })),
  );
}

function tunnels(document: ModelDocument, id: string): number {
  const state = document.states.find((each) => each.id === id);
  return state?.type === 'timed' ? (state.cycles ?? 1) : 1;
}

/** Chances of moving between sub-states in one cycle, from clocks at its start. */
export function movementMatrix(setting: Setting, cycle: number): Matrix {
  const all = subStates(setting.document);
  return all.map((origin) => {
    const chances = chancesFrom(setting, origin.state, { cycle, tunnel: origin.tunnel });
    const last = tunnels(setting.document, origin.state) - 1;
    return all.map((to) => {
      const staying = to.state === origin.state;
      const entered = staying ? Math.min(origin.tunnel + 1, last) : 0;
      return to.tunnel === entered ? (chances.get(to.state) ?? 0) : 0;
    });
  });
}

/** Chance of each destination state, by id; what is not there is 0. */
function chancesFrom(setting: Setting, from: string, moment: Moment): Map<string, number> {
  const row = rowOf(setting, from);
  if (!row) return new Map([[from, 1]]);
  if (row.basis === 'probabilities') return probabilities(row, setting, moment);
  if (row.basis === 'logit') return logit(row, setting, moment);
  if (row.method === 'byRow') return competing(row, setting, moment);
  return generated(row, setting, moment);
}

function rowOf({ document, strategy }: Setting, from: string): Row | undefined {
  if (document.movements.type !== 'rows') throw new Error('this model moves by curves');
  return document.movements.rows.find(
    (row) => row.from === from && (!row.strategies || row.strategies.includes(strategy)),
  );
}

function cellValues(row: Row, setting: Setting, moment: Moment): Map<string, number> {
  const values = new Map<string, number>();
  for (const cell of row.cells) {
    values.set(cell.to, (values.get(cell.to) ?? 0) + evaluate(cell.formula, setting, moment));
  }
  return values;
}

const total = (values: Iterable<number>): number => [...values].reduce((a, b) => a + b, 0);

function probabilities(
  row: Extract<Row, { basis: 'probabilities' }>,
  setting: Setting,
  moment: Moment,
): Map<string, number> {
  const chances = cellValues(row, setting, moment);
  const rest = 1 - total(chances.values());
  return chances.set(row.remainder, (chances.get(row.remainder) ?? 0) + rest);
}

/** Shares proportional to exp(predictor); the largest is taken out so that none overflows. */
function logit(
  row: Extract<Row, { basis: 'logit' }>,
  setting: Setting,
  moment: Moment,
): Map<string, number> {
  const predictors = cellValues(row, setting, moment).set(row.reference, 0);
  const largest = Math.max(...predictors.values());
  const weights = [...predictors].map(([to, x]) => [to, Math.exp(x - largest)] as const);
  const sum = total(weights.map(([, weight]) => weight));
  return new Map(weights.map(([to, weight]) => [to, weight / sum]));
}

/** Competing risks of this row alone: constant rates over the cycle. */
function competing(row: Row, setting: Setting, moment: Moment): Map<string, number> {
  const rates = cellValues(row, setting, moment);
  const sum = total(rates.values());
  const stay = Math.exp(-sum * setting.document.question.cycleLength);
  const chances = new Map<string, number>();
  for (const [to, rate] of rates) chances.set(to, sum === 0 ? 0 : (rate / sum) * (1 - stay));
  return chances.set(row.from, stay);
}

/**
 * Row of the exponential of the generator over the document's states. The row's own
 * state is taken at its tunnel, other timed states at their first.
 */
function generated(own: Row, setting: Setting, moment: Moment): Map<string, number> {
  const { states, question } = setting.document;
  const generator = zeros(states.length);
  states.forEach((state, i) => {
    const row = rowOf(setting, state.id);
    if (row?.basis !== 'rates' || row.method !== 'generator') return;
    const tunnel = row === own ? moment.tunnel : 0;
    for (const [to, rate] of cellValues(row, setting, { cycle: moment.cycle, tunnel })) {
      const j = states.findIndex((each) => each.id === to);
      const line = generator[i] as number[];
      line[j] = (line[j] as number) + rate;
      line[i] = (line[i] as number) - rate;
    }
  });
  const chances = exponentialRow(
    generator.map((line) => line.map((x) => x * question.cycleLength)),
    states.findIndex((each) => each.id === own.from),
  );
  return new Map(states.map((state, j) => [state.id, chances[j] as number]));
}
