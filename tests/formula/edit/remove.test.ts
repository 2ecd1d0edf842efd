import { describe, expect, test } from 'vitest';
import { prepare } from '../../../shared/engine/engine.ts';
import { removalOf } from '../../../shared/formula/edit/remove.ts';
import type { Group, ModelDocument } from '../../../shared/model/document.ts';
import { itemsOf, type Target, type What } from '../../../shared/model/edit/target.ts';
import { exampleOf } from '../../examples/load.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';
import { applied, DOCUMENTS, soundAfter } from '../../model/edit/after.ts';

const KINDS: readonly What[] = [
  'strategy',
  'state',
  'profile',
  'covariate',
  'parameter',
  'group',
  'table',
  'variable',
  'payoff',
  'scenario',
  'threshold',
];

function everyTarget(document: ModelDocument): Target[] {
  return KINDS.flatMap((what) => itemsOf(document, what).map(({ id }) => ({ what, id })));
}

const tiny = tinyDocument();

/** The document without a thing; whatever uses it gets its value. */
function without(document: ModelDocument, target: Target): ModelDocument {
  const removal = removalOf(document, target, { replace: true });
  if (!removal.possible) throw new Error(`${target.what} ${target.id}: ${removal.why}`);
  return soundAfter(document, removal.edits);
}

describe.each(DOCUMENTS)('%s', (_, document) => {
  test('anything is removed soundly, or the answer says why not', { timeout: 60_000 }, () => {
    const refused = new Set<string>();
    for (const target of everyTarget(document)) {
      const removal = removalOf(document, target, { replace: true });
      if (removal.possible) {
        const left = soundAfter(document, removal.edits);
        expect(itemsOf(left, target.what).some(({ id }) => id === target.id)).toBe(false);
      } else {
        refused.add(`${target.what} ${removal.why}`);
        expect(removal.why === 'inUse').toBe(removal.uses.length > 0);
      }
    }
    const known = [
      'table inUse',
      'covariate inUse',
      'profile lastOne',
      'state lastOne',
      'strategy lastOne',
      'threshold lastOne',
      'variable inUse',
    ];
    expect([...refused].filter((each) => !known.includes(each))).toEqual([]);
  });
});

describe('what formulas use', () => {
  test('is not removed from under them', () => {
    const removal = removalOf(tiny, { what: 'parameter', id: 'p_die' });
    expect(removal).toMatchObject({
      possible: false,
      why: 'inUse',
      replaceable: true,
      uses: [{ role: 'variable', label: 'Probability of dying in a cycle' }],
    });
  });

  test('is replaced by its value, and the answer stays', () => {
    const left = without(tiny, { what: 'parameter', id: 'rr_die' });
    expect(left.variables[0]?.formula).toEqual({
      byStrategy: { treatment: 'p_die * 0.8' },
      otherwise: 'p_die',
    });
    expect(prepare(left).base().strategies).toEqual(prepare(tiny).base().strategies);
  });

  test('a variable is replaced by its own formula, strategy by strategy', () => {
    const left = without(tiny, { what: 'variable', id: 'v_die' });
    expect(left.movements).toMatchObject({
      rows: [
        { cells: [{ formula: { byStrategy: { usual: 'p_die', treatment: '(p_die * rr_die)' } } }] },
      ],
    });
    expect(prepare(left).base().strategies).toEqual(prepare(tiny).base().strategies);
  });

  test('a negative number keeps its sign in any formula', () => {
    const parameters = tiny.parameters.map((each) =>
      each.id === 'rr_die' ? { ...each, kind: 'number' as const, value: -2 } : each,
    );
    const variables = tiny.variables.map((each) => ({ ...each, formula: 'p_die * rr_die^2 / 8' }));
    const left = without(tinyDocument({ parameters, variables }), {
      what: 'parameter',
      id: 'rr_die',
    });
    expect(left.variables[0]?.formula).toBe('p_die * (-2)^2 / 8');
  });

  test('age goes on from the start age that was', () => {
    const variables = tiny.variables.map((each) => ({ ...each, formula: 'age / 1000' }));
    const left = without(tinyDocument({ variables }), { what: 'covariate', id: 'start_age' });
    expect(left.variables[0]?.formula).toBe('(40 + time) / 1000');
    expect(left.profiles[0]?.covariates).toEqual({});
  });
});

describe('what goes along', () => {
  test('a state takes its cells and amounts; who went there stays', () => {
    const removal = removalOf(tiny, { what: 'state', id: 'dead' });
    expect(removal).toMatchObject({
      possible: true,
      along: [{ role: 'cell', label: 'Alive → Dead' }],
    });
    const left = without(tiny, { what: 'state', id: 'dead' });
    expect(left.movements).toMatchObject({ rows: [{ remainder: 'alive', cells: [] }] });
  });

  test('the remainder of the start passes on', () => {
    const left = without(tiny, { what: 'state', id: 'alive' });
    expect(left.start.remainder).toBe('dead');
    expect(left.payoffs).toEqual([]);
  });

  test('a strategy takes its formulas and its payoffs, and hands on the comparison', () => {
    const treatment = without(tiny, { what: 'strategy', id: 'treatment' });
    expect(treatment.variables[0]?.formula).toBe('p_die');
    expect(treatment.payoffs.map(({ id }) => id)).toEqual(['qalys']);
    const usual = without(tiny, { what: 'strategy', id: 'usual' });
    expect(usual.question.comparator).toBe('treatment');
  });

  test('the last of its kind stays', () => {
    expect(removalOf(tiny, { what: 'profile', id: 'all' })).toMatchObject({ why: 'lastOne' });
    expect(removalOf(tiny, { what: 'threshold', id: 'nobody' })).toMatchObject({ why: 'unknown' });
  });

  test('the share of a profile is spread over the others', () => {
    const { profiles } = without(exampleOf('keeping-hearts-well'), {
      what: 'profile',
      id: exampleOf('keeping-hearts-well').profiles[0]!.id,
    });
    expect(profiles.reduce((sum, { share }) => sum + share, 0)).toBeCloseTo(1, 12);
  });
});

describe('who parts from a group keeps its uncertainty', () => {
  const parameters = tiny.parameters.map((each) =>
    each.id === 'c_year'
      ? each
      : { ...each, distribution: { type: 'inGroup' as const, group: 'g' } },
  );
  const members = ['p_die', 'rr_die', 'u_alive'];
  const grouped = (group: Partial<Group>) =>
    tinyDocument({ parameters, groups: [{ id: 'g', label: 'G', members, ...group } as Group] });

  test('a probability of a Dirichlet row is beta', () => {
    const document = grouped({ type: 'dirichlet', counts: [1, 3, 6] });
    const left = without(document, { what: 'group', id: 'g' });
    expect(left.parameters.map(({ distribution }) => distribution)).toEqual([
      { type: 'beta', alpha: 1, beta: 9 },
      { type: 'beta', alpha: 3, beta: 7 },
      { type: 'gamma', shape: 25, scale: 4 },
      { type: 'beta', alpha: 6, beta: 4 },
    ]);
  });

  test('a joint normal of three becomes one of two', () => {
    const covariance = [
      [4, 1, 2],
      [1, 9, 3],
      [2, 3, 16],
    ];
    const document = grouped({
      type: 'multivariateNormal',
      means: [1, 2, 3],
      covariance,
      scale: 'log',
    });
    const removal = removalOf(document, { what: 'parameter', id: 'rr_die' }, { replace: true });
    expect(removal).toMatchObject({ possible: true });
    expect(removal.possible && soundGroups(document, removal.edits)).toMatchObject([
      {
        members: ['p_die', 'u_alive'],
        means: [1, 3],
        covariance: [
          [4, 2],
          [2, 16],
        ],
      },
    ]);
  });
});

function soundGroups(document: ModelDocument, edits: Parameters<typeof soundAfter>[1]) {
  return applied(document, edits).groups;
}
