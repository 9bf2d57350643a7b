import { join } from 'node:path';
import express, { Router } from 'express';
import { notFound } from '#server/errors.ts';

const YEAR = 365 * 24 * 3600 * 1000;

/** The built client: hashed assets for a year, the page itself never cached, every other address the page. */
export function clientFiles(folder: string): Router {
  const router = Router();
  // Files say themselves how long they keep; the API's "keep nothing" has been set before them.
  router.use((_request, response, next) => {
    response.removeHeader('Cache-Control');
    next();
  });
  router.use('/assets', express.static(join(folder, 'assets'), { immutable: true, maxAge: YEAR, index: false }));
  router.use('/assets', () => {
    throw notFound();
  });
  router.use(express.static(folder, { index: false, maxAge: '1h', dotfiles: 'ignore' }));
  router.get('/{*path}', (request, response) => {
    // No page has a full stop in its address: such a one asks for a file, and there is none.
    if (request.path.includes('.')) throw notFound();
    response.setHeader('Cache-Control', 'no-store');
    response.sendFile('index.html', { root: folder });
  });
  return router;
}
