/** Every formula of a document: where it is, whom it holds for, what it should be. */
import type { ModelDocument, Payoff, StrategyFormula } from '../model/document.ts';
import type { Path } from '../model/issue.ts';
import { type Definition, definitionsIn } from './definitions.ts';
import { cellPlace, type Place, payoffPlace } from './places.ts';

export interface Site {
  readonly formula: StrategyFormula;
  /** Place of `formula` in the document. */
  readonly path: Path;
  /** Strategies that it holds for. */
  readonly strategies: readonly string[];
  readonly place: Place;
  /** Whether `time_in_state` has a meaning here. */
  readonly timeInState: boolean;
}

const kindPlace = (kind: Extract<Place, { type: 'kind' }>['kind']): Place => ({
  type: 'kind',
  kind,
});

class Sites {
  private readonly document: ModelDocument;
  private readonly everyone: readonly string[];
  private readonly timed: ReadonlySet<string>;

  constructor(document: ModelDocument) {
    this.document = document;
    this.everyone = document.strategies.map(({ id }) => id);
    const timed = document.states.filter(({ type }) => type === 'timed');
    this.timed = new Set(timed.map(({ id }) => id));
  }

  all(): Site[] {
    return [
      ...this.variables(definitionsIn(this.document)),
      ...this.start(),
      ...this.movements(),
      ...this.document.payoffs.flatMap((payoff, index) => this.payoff(payoff, index)),
      ...this.scenarios(),
    ];
  }

  private site(formula: StrategyFormula, path: Path, place: Place, timeInState = false): Site {
    return { formula, path, place, timeInState, strategies: this.everyone };
  }

  private variables(definitions: readonly Definition[]): Site[] {
    return definitions.map(({ formula, path, kind = 'number' }) =>
      this.site(formula, path, kindPlace(kind), true),
    );
  }

  private start(): Site[] {
    return this.document.start.shares.map(({ formula }, index) =>
      this.site(formula, ['start', 'shares', index, 'formula'], kindPlace('probability')),
    );
  }

  private movements(): Site[] {
    const { movements } = this.document;
    if (movements.type === 'survival') {
      return movements.curves.map(({ formula }, index) =>
        this.site(formula, ['movements', 'curves', index, 'formula'], kindPlace('probability')),
      );
    }
    return movements.rows.flatMap((row, at) =>
      row.cells.map(({ formula }, index): Site => {
        const path = ['movements', 'rows', at, 'cells', index, 'formula'];
        const place = cellPlace[row.basis];
        const site = this.site(formula, path, place, this.timed.has(row.from));
        return { ...site, strategies: row.strategies ?? this.everyone };
      }),
    );
  }

  private payoff(payoff: Payoff, at: number): Site[] {
    const place = payoffPlace(payoff);
    const strategies = payoff.strategies ?? this.everyone;
    if (payoff.type === 'state') {
      return payoff.amounts.map(({ formula, state }, index) => {
        const path = ['payoffs', at, 'amounts', index, 'formula'];
        return { ...this.site(formula, path, place, this.timed.has(state)), strategies };
      });
    }
    const from = payoff.type === 'movement' ? payoff.from : undefined;
    const timeInState = from !== undefined && this.timed.has(from);
    const site = this.site(payoff.formula, ['payoffs', at, 'formula'], place, timeInState);
    return [{ ...site, strategies }];
  }

  /** The formulas that scenarios bring; the variables they leave alone are here already. */
  private scenarios(): Site[] {
    return this.document.scenarios.flatMap((scenario) => {
      const own = definitionsIn(this.document, scenario).filter(
        ({ path }) => path[0] === 'scenarios',
      );
      return this.variables(own);
    });
  }
}

/** Variables, start shares, movements or curves, payoffs, then scenarios' variables. */
export function formulaSites(document: ModelDocument): Site[] {
  return new Sites(document).all();
}
