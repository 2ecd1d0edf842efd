import { readFileSync } from 'node:fs';
import { expect, test } from 'vitest';
import { FORMAT_VERSION } from '../../shared/model/document.ts';
import { jsonSchema, jsonSchemaText } from '../../shared/model/json-schema.ts';

test('the published file is the one made from the schema (npx tsx scripts/write-json-schema.ts)', () => {
  const file = new URL(`../../public/schema/model-${FORMAT_VERSION}.json`, import.meta.url);
  expect(readFileSync(file, 'utf8')).toBe(jsonSchemaText());
});

test('says what it is, and names no host of ours', () => {
  expect(jsonSchema()).toMatchObject({
    $schema: 'https://json-schema.org/draft/2020-12/schema',
    $id: 'urn:steelyard:model:1',
    type: 'object',
  });
  expect(jsonSchemaText().match(/https?:\/\/[^"]*/g)).toEqual([
    'https://json-schema.org/draft/2020-12/schema',
  ]);
});

test('asks for what has no default and lets unknown fields through', () => {
  const schema = jsonSchema() as { required: string[]; additionalProperties: unknown };
  expect(schema.required).toContain('question');
  expect(schema.required).not.toContain('scenarios');
  expect(schema.additionalProperties).toEqual({});
});
