import { join } from 'node:path';
import express, { type Request, type RequestHandler, type Response } from 'express';

const YEAR = 'public, max-age=31536000, immutable';
/** Kept, but asked for anew each time: the page, the manifest, the service worker. */
const REVALIDATE = 'no-cache';

/** The built app. Files named by their content never change; all others are asked for anew. */
export function staticFiles(dist: string): RequestHandler {
  return express.static(dist, {
    index: false,
    redirect: false,
    cacheControl: false,
    setHeaders: (response: Response, path: string) => {
      const named = path.startsWith(join(dist, 'assets'));
      response.setHeader('Cache-Control', named ? YEAR : REVALIDATE);
    },
  });
}

/**
 * The app's page for every address that a person may open. A missing file is not
 * such an address: an old tab that asks for a script of a former version must be
 * told that it is gone, not be given a page.
 */
export function page(dist: string): RequestHandler {
  return (request, response, next) => {
    if (!isAddress(request) || !request.accepts('html')) return next();
    response.setHeader('Cache-Control', REVALIDATE);
    response.sendFile('index.html', { root: dist, cacheControl: false }, (error) => {
      if (error) next(error);
    });
  };
}

/** No address of the app has a dot in its last part; what does is a file. */
const ADDRESS = /^(?!\/assets\/).*\/[^./]*$/;

function isAddress({ method, path }: Request): boolean {
  return (method === 'GET' || method === 'HEAD') && ADDRESS.test(path) && isReadable(path);
}

function isReadable(path: string): boolean {
  try {
    decodeURIComponent(path);
    return true;
  } catch {
    return false;
  }
}
