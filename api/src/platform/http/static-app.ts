import { existsSync } from 'node:fs';
import { join, sep } from 'node:path';
import { static as serveStatic, Router, type Response } from 'express';

const ASSETS = `${sep}assets${sep}`;

/**
 * Serves the built application: hashed files under /assets for ever, everything else asked for each time.
 * Every other path opens the application itself, except below /api and /assets: a missing script must be a 404.
 */
export function staticApp(folder: string): Router {
  const router = Router();
  const index = join(folder, 'index.html');
  router.use(serveStatic(folder, { index: 'index.html', setHeaders: cacheHeaders, redirect: false }));
  router.get('/{*path}', (request, response, next) => {
    if (/^\/(api|assets)(\/|$)/.test(request.path) || !existsSync(index)) return next();
    response.setHeader('Cache-Control', 'no-cache');
    response.sendFile(index);
  });
  return router;
}

function cacheHeaders(response: Response, path: string): void {
  const isHashed = path.includes(ASSETS);
  response.setHeader('Cache-Control', isHashed ? 'public, max-age=31536000, immutable' : 'no-cache');
}
