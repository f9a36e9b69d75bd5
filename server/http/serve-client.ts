import { join } from 'node:path';
import express, { Router } from 'express';

const year = 31_536_000_000;

/** The built page: hashed files for ever, index.html for every address that is a place of the page. */
export function serveClient(folder: string): Router {
  const router = Router();
  router.use(
    '/assets',
    express.static(join(folder, 'assets'), { immutable: true, maxAge: year, fallthrough: false }),
  );
  router.use(express.static(folder, { index: false, maxAge: 0 }));
  router.get(/^\/(?!api(\/|$)).*/, (_request, response) => {
    response.set('Cache-Control', 'no-cache').sendFile(join(folder, 'index.html'));
  });
  return router;
}
