import { expect, it } from 'vitest';
import { buildTree, type Node } from '../../shared/formula/tree.ts';

it('keeps the place of a node with and without the brackets around it', () => {
  const text = ' ((a + b)) * -c ';
  const product = buildTree(text);
  const [sum, minus] = [product.left as Node, product.right as Node];
  const cut = (span: Node['extent']) => span && text.slice(span.start, span.end);
  expect(cut(sum.extent)).toBe('((a + b))');
  expect(cut((sum.left as Node).inner)).toBe('a');
  expect(cut(minus.extent)).toBe('-c');
  expect(minus).toMatchObject({ type: 'UnaryExpression', operator: '-' });
});

it('starts afresh inside brackets and arguments after a prefix', () => {
  const negated = buildTree('-(a + b)').argument as Node;
  expect(negated).toMatchObject({ type: 'BinaryExpression', operator: '+' });
  const call = buildTree('-f(a or b)').argument as Node;
  expect((call.arguments as Node[])[0]).toMatchObject({ operator: 'or' });
});
