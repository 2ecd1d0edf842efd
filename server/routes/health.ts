import { sql } from 'drizzle-orm';
import { Router } from 'express';
import { hub } from '../../shared/db/hub.ts';
import type { Database } from '../db.ts';
import { VERSION } from '../version.ts';

/**
 * `GET /api/v1/health`: `{ status, version, database: { status } }`. 503 when the
 * database does not answer.
 */
export function healthRoutes(database: Database): Router {
  return Router().get('/health', (_request, response) => {
    const healthy = answers(database);
    response.status(healthy ? 200 : 503).json({
      status: healthy ? 'ok' : 'failing',
      version: VERSION,
      database: { status: healthy ? 'ok' : 'failing' },
    });
  });
}

function answers(database: Database): boolean {
  try {
    const rows = database.orm.select({ count: sql<number>`count(*)` }).from(hub).get();
    return rows?.count === 1;
  } catch {
    return false;
  }
}
