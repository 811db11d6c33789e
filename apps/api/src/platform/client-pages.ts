import { join } from 'node:path';
import express, { Router, type RequestHandler } from 'express';

const immutable = 'public, max-age=31536000, immutable';

/** Built files carry a hash in their names and never change; the page itself is asked for each time. */
const files = (folder: string): RequestHandler =>
  express.static(folder, {
    index: false,
    redirect: false,
    setHeaders: (res, path) => void res.set('Cache-Control', path.includes('/assets/') ? immutable : 'no-cache'),
  });

/** The three clients under one origin. Any other path below a client's root is one of its pages. */
export function clientPages(folder: string): Router {
  const router = Router();
  for (const [root, app] of [
    ['/sell', 'seller'],
    ['/desk', 'desk'],
    ['/', 'buyer'],
  ] as const) {
    const dist = join(folder, app, 'dist');
    router.use(root, files(dist));
    router.get(root === '/' ? '/{*page}' : [root, `${root}/{*page}`], (req, res, next) => {
      if (/\.[a-z0-9]+$/i.test(req.path) || req.path.startsWith('/api/')) return next();
      res.set('Cache-Control', 'no-cache').sendFile(join(dist, 'index.html'));
    });
  }
  return router;
}
