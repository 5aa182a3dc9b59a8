import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { basename } from 'node:path/posix';
import express, { Router } from 'express';
import { RefusalError } from './refusal.ts';

const notThere = () => new RefusalError('not-found', 'There is nothing at this address.');

/**
 * The built screens. Assets carry a hash in their name and may be kept for ever; the page itself is
 * asked for anew each time, as it names the assets. A missing file is not the page.
 */
export function clientFiles(folder: string): Router {
  const router = Router();
  router.use(
    '/assets',
    express.static(join(folder, 'assets'), { immutable: true, maxAge: '1y', index: false }),
  );
  router.use('/assets', () => {
    throw notThere();
  });
  router.use(
    express.static(folder, {
      index: false,
      setHeaders: (response) => response.setHeader('Cache-Control', 'no-cache'),
    }),
  );
  router.get('/{*splat}', (request, response) => {
    if (basename(request.path).includes('.') || !existsSync(join(folder, 'index.html')))
      throw notThere();
    response.setHeader('Cache-Control', 'no-cache');
    response.sendFile('index.html', { root: folder });
  });
  return router;
}
