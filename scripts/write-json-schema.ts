/** Writes the published JSON Schema of the model document into public/schema/. */
import { mkdirSync, writeFileSync } from 'node:fs';
import { FORMAT_VERSION } from '../shared/model/document.ts';
import { jsonSchemaText } from '../shared/model/json-schema.ts';

const folder = new URL('../public/schema/', import.meta.url);
mkdirSync(folder, { recursive: true });
writeFileSync(new URL(`model-${FORMAT_VERSION}.json`, folder), jsonSchemaText());
