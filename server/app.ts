import compression from 'compression';
import express, { type Express } from 'express';
import type { Database } from './db.ts';
import { errorHandler, notFound } from './errors.ts';
import { healthRoutes } from './routes/health.ts';
import { securityHeaders } from './security.ts';
import { page, staticFiles } from './static.ts';

export interface AppOptions {
  readonly database: Database;
  /** Folder of the built app; without one the hub serves its API alone. */
  readonly dist?: string;
  /** People reach the hub by https. */
  readonly secure?: boolean;
  /** Where the hub's own faults go. */
  readonly log?: (error: unknown) => void;
}

/** The hub and the app as one handler, for the server and for tests. */
export function createApp({ database, dist, secure = false, log }: AppOptions): Express {
  const app = express();
  app.disable('x-powered-by');
  app.set('query parser', 'simple');
  app.use(securityHeaders(secure), compression());
  app.use('/api', api(database));
  if (dist) app.use(staticFiles(dist), page(dist));
  app.use(notFound, errorHandler(log ?? ((error) => console.error(error))));
  return app;
}

function api(database: Database) {
  const router = express.Router();
  router.use((_request, response, next) => {
    response.setHeader('Cache-Control', 'no-store');
    next();
  });
  router.use('/v1', healthRoutes(database));
  return router.use(notFound);
}
