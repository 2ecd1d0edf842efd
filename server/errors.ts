import type { ErrorRequestHandler, RequestHandler } from 'express';
import { Fault } from './fault.ts';

/** Nothing is at this address. */
export const notFound: RequestHandler = (request, _response, next) => {
  const path = request.originalUrl.replace(/\?.*$/, '');
  next(new Fault('request.notFound', 404, { method: request.method, path }));
};

/** Says an error as data; what went wrong inside is logged, never sent. */
export function errorHandler(log: (error: unknown) => void): ErrorRequestHandler {
  return (error, _request, response, next) => {
    if (response.headersSent) return next(error);
    const fault = asFault(error);
    if (fault.status >= 500) log(error);
    response.status(fault.status).setHeader('Cache-Control', 'no-store').json(fault.body());
  };
}

/** Express and its middleware mark what the client did wrong with a status of 4xx. */
function asFault(error: unknown): Fault {
  if (error instanceof Fault) return error;
  const status = (error as { status?: unknown } | null)?.status;
  if (status === 404) return new Fault('request.notFound', 404);
  if (typeof status === 'number' && status >= 400 && status < 500) {
    return new Fault('request.invalid', status);
  }
  return new Fault('hub.internal', 500);
}
