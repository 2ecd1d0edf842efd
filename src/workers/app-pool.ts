/** The page's one pool: workers start with the first document that is run. */
import type { ModelDocument } from '../../shared/model/document.ts';
import { getSettings } from '../store/settings.ts';
import { createPool, type Job, type Pool } from './pool.ts';
import { poolSize, spawnSimulator } from './spawn.ts';

let pool: Pool | null = null;
const keys = new WeakMap<ModelDocument, string>();
let count = 0;

export function appPool(): Pool {
  pool ??= createPool(spawnSimulator, poolSize(getSettings().workers));
  return pool;
}

/** The same document object is the same job, so that workers load it once. */
export function jobFor(document: ModelDocument): Job {
  let key = keys.get(document);
  if (key === undefined) {
    key = `document-${++count}`;
    keys.set(document, key);
  }
  return { key, document };
}
