import { describe, expect, it } from 'vitest';
import { checkGroups } from '../../../shared/engine/distributions/check-groups.ts';
import type { Distribution, Group, Parameter } from '../../../shared/model/document.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';
import { parameter } from '../draw/parameter.ts';

const inGroup = (id: string, value: number, kind: Parameter['kind'] = 'probability') =>
  parameter(id, { type: 'inGroup', group: 'g' }, value, kind);
const own = (id: string, distribution: Distribution = { type: 'normal', mean: 0, sd: 1 }) =>
  parameter(id, distribution, 0);

const check = (parameters: Parameter[], ...groups: Group[]) =>
  checkGroups(tinyDocument({ parameters, groups })).map(({ code }) => code);

const dirichlet = (more: object = {}): Group => ({
  id: 'g',
  label: 'Moves',
  type: 'dirichlet',
  members: ['a', 'b'],
  counts: [6, 4],
  ...more,
});
const normal = (more: object = {}): Group => ({
  id: 'g',
  label: 'Coefficients',
  type: 'multivariateNormal',
  members: ['a', 'b'],
  means: [0, 0],
  covariance: [
    [1, 0.5],
    [0.5, 2],
  ],
  scale: 'identity',
  ...more,
});
const ranks = (more: object = {}): Group => ({
  id: 'g',
  label: 'Together',
  type: 'rankCorrelation',
  members: ['a', 'b'],
  correlation: [
    [1, 0.6],
    [0.6, 1],
  ],
  ...more,
});
const rows = (more: object = {}): Group => ({
  id: 'g',
  label: 'Posterior',
  type: 'jointRows',
  members: ['a', 'b'],
  rows: [
    [0.1, 0.2],
    [0.3, 0.4],
  ],
  ...more,
});

const shares = [inGroup('a', 0.6), inGroup('b', 0.4)];
const coefficients = [inGroup('a', 0, 'logOdds'), inGroup('b', 0, 'logOdds')];
const alone = [own('a'), own('b')];

describe('checkGroups', () => {
  it('finds nothing in sound groups', () => {
    expect(check(shares, dirichlet())).toEqual([]);
    expect(check(coefficients, normal())).toEqual([]);
    expect(check(alone, ranks())).toEqual([]);
    expect(check([inGroup('a', 0.1), inGroup('b', 0.4)], rows())).toEqual([]);
  });

  it('refuses members that are unknown, repeated, in two groups or pointing elsewhere', () => {
    expect(check(shares, dirichlet({ members: ['a', 'x'] }))).toEqual([
      'distribution.noGroup',
      'group.unknownMember',
    ]);
    const repeated = dirichlet({ members: ['a', 'b', 'a'], counts: [1, 1, 1] });
    expect(check(shares, repeated)).toEqual(['group.repeatedMember']);
    expect(check(shares, dirichlet(), ranks({ id: 'h' }))).toContain('group.memberInTwo');
    expect(check([own('a'), inGroup('b', 0.4)], dirichlet())).toEqual(['group.notPointing']);
    expect(check([inGroup('z', 0.4)])).toEqual(['distribution.noGroup']);
  });

  it('refuses lists and matrices of the wrong size', () => {
    expect(check(shares, dirichlet({ counts: [1, 2, 3] }))).toEqual(['group.size']);
    expect(check(coefficients, normal({ means: [0] }))).toEqual(['group.size']);
    const short = rows({ rows: [[0.1, 0.2], [0.3]] });
    expect(check([inGroup('a', 0.1), inGroup('b', 0.2)], short)).toEqual(['group.size']);
    expect(check(alone, ranks({ correlation: [[1, 0.1]] }))).toContain('group.size');
  });

  it('refuses matrices that are no covariance or correlation', () => {
    const covariance = (values: number[][]) => check(coefficients, normal({ covariance: values }));
    expect(
      covariance([
        [1, 0.5],
        [0.4, 2],
      ]),
    ).toEqual(['group.notSymmetric']);
    expect(
      covariance([
        [1, 2],
        [2, 1],
      ]),
    ).toEqual(['group.notPositiveDefinite']);
    expect(
      covariance([
        [0, 0],
        [0, 1],
      ]),
    ).toEqual(['group.notPositiveDefinite']);
    expect(
      covariance([
        [1, Number.NaN],
        [Number.NaN, 1],
      ]),
    ).toEqual(['group.notFinite']);
    const correlation = (values: number[][]) => check(alone, ranks({ correlation: values }));
    expect(
      correlation([
        [1, 1.2],
        [1.2, 1],
      ]),
    ).toEqual(['group.notCorrelation']);
    expect(
      correlation([
        [2, 0.2],
        [0.2, 2],
      ]),
    ).toEqual(['group.notCorrelation']);
    expect(
      correlation([
        [1, 1],
        [1, 1],
      ]),
    ).toEqual(['group.notPositiveDefinite']);
  });

  it('refuses a rank correlation of members without a distribution of their own', () => {
    expect(check([own('a', { type: 'fixed' }), own('b')], ranks())).toEqual(['group.memberFixed']);
    expect(check([inGroup('a', 0), own('b')], ranks())).toEqual(['group.ownDistribution']);
  });

  it('refuses a base value outside its marginal and warns of one far from it', () => {
    expect(check([inGroup('a', 1.1), inGroup('b', -0.1)], dirichlet())).toEqual([
      'distribution.valueOutside',
      'distribution.valueOutside',
    ]);
    const far = [inGroup('a', 9, 'logOdds'), inGroup('b', 0, 'logOdds')];
    expect(check(far, normal())).toEqual(['distribution.valueFar']);
    expect(check([inGroup('a', 0), inGroup('b', 0.1)], normal())).toContain(
      'distribution.outsideKind',
    );
  });

  it('warns of a Dirichlet of other kinds, or whose base values do not sum to 1', () => {
    const kinds = [inGroup('a', 0.6, 'utility'), inGroup('b', 0.4)];
    expect(check(kinds, dirichlet())).toEqual(['group.kind']);
    expect(check([inGroup('a', 0.6), inGroup('b', 0.3)], dirichlet())).toEqual(['group.valuesSum']);
  });
});
