import { basename, resolve } from 'node:path';
import express, { Router } from 'express';

/** File names that carry a hash of their content, as the client's build writes them. */
const hashed = /-[A-Z0-9]{8}\.(?:js|css|woff2?|svg|png|webp)$/;

/** The built client: its files, and its page for every other address outside the api. */
export function staticClient(folder: string): Router {
  const root = resolve(folder);
  const router = Router();
  router.use(
    express.static(root, {
      index: false,
      setHeaders: (response, path) => {
        const keeps = hashed.test(basename(path)) ? 'public, max-age=31536000, immutable' : 'no-cache';
        response.setHeader('Cache-Control', keeps);
      },
    }),
  );
  // A file that is not there is not the page; a step's code such as 8.6 is no file.
  router.get('/{*splat}', (request, response, next) => {
    if (/^\/api(?:\/|$)/.test(request.path) || /\.[a-z]\w*$/i.test(request.path)) {
      next();
      return;
    }
    response.sendFile('index.html', { root, headers: { 'Cache-Control': 'no-cache' } });
  });
  return router;
}
