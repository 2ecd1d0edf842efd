/**
 *   referencesTo(document, target): Use[]
 *
 * Where a thing is used by its id. Formulas, which use symbols, are for
 * shared/formula/edit/uses.ts.
 */
import type { ModelDocument, Payoff, Row, StrategyFormula } from '../document.ts';
import type { Place } from './edit.ts';
import { formulaPlaces } from './formula-sites.ts';
import { restOf, rowPlace } from './rows.ts';
import type { Target } from './target.ts';
import { type Role, type Use, useAt } from './use.ts';

type Found = readonly [role: Role, place: Place];

export function referencesTo(document: ModelDocument, { what, id }: Target): Use[] {
  return found(document, what, id).map(([role, place]) => useAt(document, role, place));
}

function found(document: ModelDocument, what: Target['what'], id: string): Found[] {
  switch (what) {
    case 'state':
      return stateUses(document, id);
    case 'strategy':
      return strategyUses(document, id);
    case 'parameter':
      return [...groupsWith(document, id), ...overriding(document, 'parameter', id)];
    case 'variable':
      return overriding(document, 'variable', id);
    case 'group':
      return drawnIn(document, id);
    case 'covariate':
      return valuedIn(document, id);
    case 'threshold': {
      const isInForce = document.question.thresholdInForce === id;
      return isInForce ? [['thresholdInForce', ['question', 'thresholdInForce']]] : [];
    }
    default:
      return [];
  }
}

function groupsWith(document: ModelDocument, parameter: string): Found[] {
  const groups = document.groups.filter(({ members }) => members.includes(parameter));
  return groups.map(({ id }) => ['group', ['groups', { id }, 'members']]);
}

function overriding(document: ModelDocument, type: 'parameter' | 'variable', id: string): Found[] {
  const scenarios = document.scenarios.filter(({ overrides }) =>
    overrides.some((each) => each.type === type && each[type] === id),
  );
  return scenarios.map(({ id: scenario }) => [
    'scenario',
    ['scenarios', { id: scenario }, 'overrides'],
  ]);
}

function drawnIn(document: ModelDocument, group: string): Found[] {
  const drawn = document.parameters.filter(
    ({ distribution }) => distribution.type === 'inGroup' && distribution.group === group,
  );
  return drawn.map(({ id }) => ['parameter', ['parameters', { id }, 'distribution']]);
}

function valuedIn(document: ModelDocument, covariate: string): Found[] {
  const profiles = document.profiles.filter(({ covariates }) =>
    Object.hasOwn(covariates, covariate),
  );
  return profiles.map(({ id }) => ['profile', ['profiles', { id }, 'covariates', covariate]]);
}

function stateUses(document: ModelDocument, state: string): Found[] {
  return [
    ...startUses(document, state),
    ...movementUses(document, state),
    ...document.payoffs.flatMap((payoff) => payoffUses(payoff, state)),
  ];
}

function startUses({ start }: ModelDocument, state: string): Found[] {
  const shares = start.shares.filter((share) => share.state === state);
  return [
    ...(start.remainder === state ? [['rest', ['start', 'remainder']] as const] : []),
    ...shares.map(({ id }): Found => ['start', ['start', 'shares', { id }]]),
  ];
}

function movementUses({ movements }: ModelDocument, state: string): Found[] {
  if (movements.type === 'rows') return movements.rows.flatMap((row) => rowUses(row, state));
  const curves = movements.curves.filter((curve) => curve.state === state);
  return [
    ...curves.map(({ id }): Found => ['curve', ['movements', 'curves', { id }]]),
    ...(movements.last === state ? [['rest', ['movements', 'last']] as const] : []),
  ];
}

function rowUses(row: Row, state: string): Found[] {
  const at = rowPlace(row.id);
  if (row.from === state) return [['row', at]];
  const cells = row.cells.filter(({ to }) => to === state);
  return [
    ...cells.map(({ id }): Found => ['cell', [...at, 'cells', { id }]]),
    ...(restOf(row) === state ? [['rest', at] as const] : []),
  ];
}

function payoffUses(payoff: Payoff, state: string): Found[] {
  const at: Place = ['payoffs', { id: payoff.id }];
  switch (payoff.type) {
    case 'state':
      return payoff.amounts
        .filter((amount) => amount.state === state)
        .map(({ id }) => ['amount', [...at, 'amounts', { id }]]);
    case 'movement':
      return payoff.from === state || payoff.to === state ? [['payoff', at]] : [];
    case 'once':
      return payoff.states?.includes(state) ? [['payoff', [...at, 'states']]] : [];
    case 'start':
      return [];
  }
}

function strategyUses(document: ModelDocument, strategy: string): Found[] {
  const { question, movements, payoffs, scenarios } = document;
  const rows = movements.type === 'rows' ? movements.rows : [];
  const own = formulaPlaces(document).filter(({ formula }) => hasOwnText(formula, strategy));
  const overriding = scenarios.filter(({ overrides }) =>
    overrides.some((each) => each.type === 'variable' && hasOwnText(each.formula, strategy)),
  );
  return [
    ...(question.comparator === strategy
      ? [['comparator', ['question', 'comparator']] as const]
      : []),
    ...rows
      .filter(({ strategies }) => strategies?.includes(strategy))
      .map(({ id }): Found => ['limitedTo', rowPlace(id)]),
    ...payoffs
      .filter(({ strategies }) => strategies?.includes(strategy))
      .map(({ id }): Found => ['limitedTo', ['payoffs', { id }]]),
    ...own.map(({ at }): Found => ['ownFormula', at]),
    ...overriding.map(({ id }): Found => ['ownFormula', ['scenarios', { id }, 'overrides']]),
  ];
}

function hasOwnText(formula: StrategyFormula, strategy: string): boolean {
  return typeof formula !== 'string' && Object.hasOwn(formula.byStrategy, strategy);
}
