/**
 * Draws of the parameters: uniforms by the sampling plan, one stream a parameter, each
 * through the inverse of its distribution function.
 */
import type { Group, Parameter } from '../../model/document.ts';
import { DocumentError, error } from '../../model/issue.ts';
import { distributionOf } from '../distributions/distribution.ts';
import type { SamplingSettings } from '../results.ts';
import { drawDirichlet } from './dirichlet.ts';
import { drawRows } from './joint-rows.ts';
import { drawMultivariateNormal } from './multivariate-normal.ts';
import { planUniforms, type Uniforms } from './plan.ts';
import { correlateUniforms } from './rank-correlation.ts';

/**
 * Parameter id -> draws `from`..`to` (end not included) of the plan of `settings.samples`
 * draws. A `fixed` parameter gives its value in every draw. A draw depends on the seed, the
 * plan, its number, and the parameter (or its group) alone: not on the block that is asked
 * for nor on other parameters (the Sobol plan's exception: docs/decisions/004).
 * Throws DocumentError where a parameter points to no group or a group cannot be drawn;
 * run `checkDistribution` and `checkGroups` first.
 */
export function drawParameters(
  parameters: readonly Parameter[],
  groups: readonly Group[],
  settings: SamplingSettings,
  from: number,
  to: number,
): Map<string, Float64Array> {
  const drawn = drawGroups(parameters, groups, settings, from, to);
  const result = new Map<string, Float64Array>();
  for (const parameter of parameters) {
    const column = drawn.get(parameter.id);
    if (!column) throw noGroup(parameter);
    result.set(parameter.id, column);
  }
  return result;
}

function drawGroups(
  parameters: readonly Parameter[],
  groups: readonly Group[],
  settings: SamplingSettings,
  from: number,
  to: number,
): Map<string, Float64Array> {
  const present = new Map(parameters.map((parameter) => [parameter.id, parameter]));
  const drawable = groups.filter((group) => group.members.some((id) => present.has(id)));
  const alone = ownStreams(parameters, drawable);
  const uncertain = alone.filter(({ distribution }) => distribution.type !== 'fixed');
  const names = [...drawable.flatMap(streamNames), ...uncertain.map(({ id }) => ['parameter', id])];
  const uniforms = planUniforms(names, settings, from, to);
  const drawn = new Map<string, Float64Array>();
  for (const group of drawable) {
    const columns = drawGroup(group, present, uniforms);
    group.members.forEach((id, i) => {
      drawn.set(id, columns[i] ?? new Float64Array());
    });
  }
  for (const parameter of alone) drawn.set(parameter.id, drawAlone(parameter, uniforms, to - from));
  return drawn;
}

/** Parameters that are drawn by themselves. */
function ownStreams(parameters: readonly Parameter[], groups: readonly Group[]): Parameter[] {
  const members = new Set(groups.flatMap((group) => group.members));
  return parameters.filter(
    ({ id, distribution }) => distribution.type !== 'inGroup' && !members.has(id),
  );
}

/** Names of the streams that a group draws from: one a member, or one for whole rows. */
function streamNames(group: Group): string[][] {
  if (group.type === 'jointRows') return [['group', group.id]];
  return group.members.map((member) => ['group', group.id, member]);
}

function drawAlone(parameter: Parameter, uniforms: Uniforms, draws: number): Float64Array {
  const { distribution, value } = parameter;
  if (distribution.type === 'fixed') return new Float64Array(draws).fill(value);
  if (distribution.type === 'inGroup') throw noGroup(parameter);
  const { quantile } = distributionOf(distribution, value);
  return uniforms(['parameter', parameter.id]).map(quantile);
}

/** A column a member, in the order of the members. */
function drawGroup(
  group: Group,
  parameters: ReadonlyMap<string, Parameter>,
  uniforms: Uniforms,
): Float64Array[] {
  const columns = streamNames(group).map(uniforms);
  switch (group.type) {
    case 'dirichlet':
      return drawDirichlet(group.counts, columns);
    case 'multivariateNormal':
      return drawMultivariateNormal(group, columns);
    case 'jointRows':
      return drawRows(group.rows, group.members.length, columns[0] ?? new Float64Array());
    case 'rankCorrelation':
      return correlateUniforms(group, columns).map((column, i) => {
        const parameter = parameters.get(group.members[i] ?? '');
        return parameter ? throughOwn(parameter, column) : column;
      });
  }
}

/** A member of a rank correlation keeps its own distribution. */
function throughOwn(parameter: Parameter, uniforms: Float64Array): Float64Array {
  const { distribution, value } = parameter;
  if (distribution.type === 'inGroup') throw noGroup(parameter);
  return uniforms.map(distributionOf(distribution, value).quantile);
}

function noGroup(parameter: Parameter): DocumentError {
  const { id, symbol, distribution } = parameter;
  const group = distribution.type === 'inGroup' ? distribution.group : '';
  return new DocumentError([
    error('distribution.noGroup', ['parameters', id], { parameter: symbol, group }),
  ]);
}
