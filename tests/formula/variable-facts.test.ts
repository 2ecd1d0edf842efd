import { expect, it } from 'vitest';
import { definitionsIn } from '../../shared/formula/definitions.ts';
import { inferred, NUMBER } from '../../shared/formula/kind-algebra.ts';
import { orderForAll } from '../../shared/formula/order.ts';
import { buildScope } from '../../shared/formula/scope.ts';
import { variableFacts } from '../../shared/formula/variable-facts.ts';
import { documentWith, EVERY_KIND, type VariableList, variables } from './documents.ts';

function facts(formulas: Record<string, VariableList[number]['formula']>) {
  const document = documentWith({ parameters: EVERY_KIND, variables: variables(formulas) });
  const { order } = orderForAll(definitionsIn(document));
  return variableFacts(order, ['usual', 'treatment'], buildScope(document).scope);
}

it('infers kinds along the definitions', () => {
  const { kinds } = facts({ both: 'low * ratio', low: 'r', mixed: 'low * years', bad: '1 +' });
  expect(kinds.get('both')).toEqual(inferred('rate'));
  expect(kinds.get('mixed')).toEqual(NUMBER);
  expect(kinds.get('bad')).toEqual(NUMBER);
});

it('takes the kind that all strategies share, or none', () => {
  const { kinds } = facts({
    same: { byStrategy: { usual: 'p' }, otherwise: 'q' },
    different: { byStrategy: { usual: 'p' }, otherwise: 'r' },
  });
  expect(kinds.get('same')).toEqual(inferred('probability'));
  expect(kinds.get('different')).toEqual(NUMBER);
});

it('knows under which strategies a variable hangs on time in state', () => {
  const { timed } = facts({
    through: { byStrategy: { usual: '1' }, otherwise: 'direct + 1' },
    direct: { byStrategy: { usual: 'time_in_state', treatment: 'time_in_state * 2' } },
    some: { byStrategy: { usual: 'time_in_state' }, otherwise: '1' },
    both: 'some + 1',
    none: 'time',
  });
  const sets = [...timed].map(([symbol, strategies]) => [symbol, [...strategies].sort()]);
  expect(Object.fromEntries(sets)).toEqual({
    direct: ['treatment', 'usual'],
    through: ['treatment'],
    some: ['usual'],
    both: ['usual'],
  });
});
