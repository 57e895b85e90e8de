import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import express, { Router } from 'express';
import { nonceOf } from './security-headers';

/** Serves the built client: hashed files for a year, and index.html with a fresh nonce for every other address. */
export function clientFiles(folder: string): Router {
  const router = Router();
  const indexFile = join(folder, 'index.html');
  if (!existsSync(indexFile)) {
    router.get('/{*path}', (_request, response) => {
      response
        .status(503)
        .type('text/plain')
        .send('The client is not built. Run npm start, which builds it.');
    });
    return router;
  }
  const index = readFileSync(indexFile, 'utf8');
  router.use(
    express.static(folder, { index: false, immutable: true, maxAge: '365d', setHeaders: unhashed }),
  );
  router.get('/{*path}', (_request, response) => {
    response
      .type('html')
      .setHeader('Cache-Control', 'no-store')
      .send(index.replaceAll('__CSP_NONCE__', nonceOf(response)));
  });
  return router;
}

/** Files whose name does not change with their content must be asked for again. */
function unhashed(response: { setHeader(name: string, value: string): void }, path: string): void {
  if (!/-[A-Z0-9]{8}\.\w+$/.test(path)) response.setHeader('Cache-Control', 'no-cache');
}
