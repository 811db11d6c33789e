import { Router } from 'express';
import type { World } from './world.ts';

/** `/healthz`: the process answers. `/readyz`: it can also reach its database. */
export function healthRoutes({ db }: Pick<World, 'db'>): Router {
  return Router()
    .get('/healthz', (_req, res) => void res.type('text/plain').send('ok'))
    .get('/readyz', async (_req, res) => {
      const ready = await db.query('select 1').then(
        () => true,
        () => false,
      );
      res
        .status(ready ? 200 : 503)
        .type('text/plain')
        .send(ready ? 'ready' : 'the database does not answer');
    });
}
