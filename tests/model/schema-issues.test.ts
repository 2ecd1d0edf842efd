import { expect, test } from 'vitest';
import { z } from 'zod';
import { schemaIssue, shown, typeName } from '../../shared/model/schema-issues.ts';

function issueOf(schema: z.ZodType, value: unknown) {
  const result = schema.safeParse(value);
  return schemaIssue(result.error!.issues[0]!, value, ['here']);
}

test.each([
  [z.number(), 'x', 'document.invalidType', { expected: 'number', got: 'string' }],
  [z.number(), undefined, 'document.missing', { expected: 'number' }],
  [z.string(), null, 'document.invalidType', { expected: 'string', got: 'null' }],
  [z.number().int(), 1.5, 'document.invalidType', { expected: 'int', got: 'number' }],
  [z.enum(['a', 'b']), 'c', 'document.invalidValue', { allowed: 'a, b', got: 'c' }],
  [z.number().min(0), -1, 'document.tooSmall', { minimum: 0 }],
  [z.number().positive(), 0, 'document.notAbove', { minimum: 0 }],
  [z.number().max(1), 2, 'document.tooBig', { maximum: 1 }],
  [z.number().lt(1), 1, 'document.notBelow', { maximum: 1 }],
  [z.string().min(1), '', 'document.textTooShort', { minimum: 1 }],
  [z.string().max(2), 'abc', 'document.textTooLong', { maximum: 2 }],
  [z.array(z.number()).min(1), [], 'document.tooFewItems', { minimum: 1 }],
  [z.array(z.number()).max(1), [1, 2], 'document.tooManyItems', { maximum: 1 }],
  [z.string().regex(/^a$/), 'b', 'document.invalidFormat', { got: 'b' }],
  [z.string().refine(() => false), 'b', 'document.hostileName', { got: 'b' }],
  [z.union([z.number(), z.boolean()]), 'b', 'document.invalid', { got: 'b' }],
])('case %#: %3$s', (schema, value, code, params) => {
  expect(issueOf(schema as z.ZodType, value)).toEqual({
    code,
    severity: 'error',
    path: ['here'],
    params,
  });
});

test('types are JSON types', () => {
  expect([null, [], {}, 1, 'a', true].map(typeName)).toEqual([
    'null',
    'array',
    'object',
    'number',
    'string',
    'boolean',
  ]);
});

test('quotes values in short and leaves objects out', () => {
  expect(shown('x'.repeat(100)).toString().length).toBe(60);
  expect(shown({ secret: 1 })).toBe('object');
  expect(shown(3)).toBe(3);
});
