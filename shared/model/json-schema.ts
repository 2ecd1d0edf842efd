import { z } from 'zod';
import { documentSchema, FORMAT_VERSION } from './document.ts';

/**
 * The published JSON Schema (draft 2020-12) of a document as it is written: fields
 * with a default may be left out. What a schema cannot say (references between parts,
 * sums, sizes) is checked on reading.
 */
export function jsonSchema(): Record<string, unknown> {
  const { $schema, ...schema } = z.toJSONSchema(documentSchema, { io: 'input' });
  return {
    $schema,
    $id: `urn:steelyard:model:${FORMAT_VERSION}`,
    title: `Steelyard model document, format version ${FORMAT_VERSION}`,
    ...schema,
  };
}

/** The schema's file, as the script writes it and the test expects it. */
export function jsonSchemaText(): string {
  return `${JSON.stringify(jsonSchema(), null, 2)}\n`;
}
