/**
 *   movesOf(document, strategy): Move[]
 *
 * Who can go where, under one strategy or (null) under any: what the diagram draws. A cell
 * of 0 moves nobody. Survival curves are passed through in their order.
 */
import type { ModelDocument, Row } from '../../../../shared/model/document.ts';
import { restOf, rowFor } from '../../../../shared/model/edit/rows.ts';
import { formulaFor } from '../../../../shared/model/strategy-formula.ts';

export interface Move {
  readonly from: string;
  readonly to: string;
  /** Formulas, one a strategy where they differ; empty for what takes the rest. */
  readonly formulas: readonly string[];
}

export function movesOf(document: ModelDocument, strategy: string | null): Move[] {
  const { movements, strategies } = document;
  if (movements.type === 'survival') {
    const order = [...movements.curves.map(({ state }) => state), movements.last];
    return order.slice(1).map((to, index) => ({ from: order[index] ?? to, to, formulas: [] }));
  }
  const ids = strategy === null ? strategies.map(({ id }) => id) : [strategy];
  const moves = new Map<string, Move>();
  for (const id of ids) {
    for (const { id: from } of document.states) {
      const row = rowFor(document, from, id);
      for (const move of row ? movesOut(row, id) : []) {
        const key = `${move.from} ${move.to}`;
        const known = moves.get(key)?.formulas ?? [];
        moves.set(key, { ...move, formulas: [...new Set([...known, ...move.formulas])] });
      }
    }
  }
  return [...moves.values()];
}

function movesOut(row: Row, strategy: string): Move[] {
  const { from } = row;
  const cells = row.cells.flatMap(({ to, formula }): Move[] => {
    const text = formulaFor(formula, strategy);
    const isNone = text === undefined || (text.trim() === '0' && row.basis !== 'logit');
    return to === from || isNone ? [] : [{ from, to, formulas: [text] }];
  });
  const rest = restOf(row);
  return rest === from ? cells : [...cells, { from, to: rest, formulas: [] }];
}
