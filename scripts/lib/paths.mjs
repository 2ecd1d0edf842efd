import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';

/** The repository's root. */
export const ROOT = dirname(dirname(dirname(fileURLToPath(import.meta.url))));

/** A path inside the repository. */
export function inRepository(...parts) {
  return join(ROOT, ...parts);
}
