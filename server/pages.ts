import { existsSync } from 'node:fs';
import type { Server } from 'node:http';
import { join, resolve } from 'node:path';
import express, { type RequestHandler } from 'express';

/** Whatever answers the addresses that are not the API's. */
export type Pages = RequestHandler;

const isApi = (path: string) => /^\/api(\/|$)/.test(path);

/** A page's address, as opposed to a file's or the API's. */
function wantsPage(method: string, path: string): boolean {
  const isFile = /^\/assets(\/|$)/.test(path) || /\.[a-z0-9]{2,5}$/i.test(path);
  return (method === 'GET' || method === 'HEAD') && !isApi(path) && !isFile;
}

/** What decides which release a browser shows. */
const ASKED_ANEW = /(\.html|\.webmanifest|[\\/]sw\.js)$/;

/**
 * The built pages. Hashed files are kept by browsers for a year; `index.html` is asked for anew each time.
 * A file that is not there is a 404, never `index.html`: a page that was left open over an update must notice.
 */
export function builtPages(distDir: string): Pages {
  const root = resolve(distDir);
  const router = express.Router();
  const noFallback = { fallthrough: true, index: false, redirect: false } as const;
  router.use(
    '/assets',
    express.static(join(root, 'assets'), { ...noFallback, immutable: true, maxAge: '1y' }),
  );
  router.use(
    express.static(root, {
      ...noFallback,
      setHeaders: (res, path) =>
        res.setHeader('Cache-Control', ASKED_ANEW.test(path) ? 'no-cache' : 'public, max-age=3600'),
      dotfiles: 'ignore',
    }),
  );
  router.use((req, res, next) => {
    if (!wantsPage(req.method, req.path)) return next();
    res.setHeader('Cache-Control', 'no-cache');
    res.sendFile('index.html', { root }, (error) => (error ? next(error) : undefined));
  });
  return router;
}

export const pagesAreBuilt = (distDir: string): boolean => existsSync(join(distDir, 'index.html'));

/** The pages from their sources, for work on them: same port, same cookies, changes at once. */
export async function vitePages(
  root: string,
  server: Server,
): Promise<{ pages: Pages; close: () => Promise<void> }> {
  const vite = await import('vite');
  const dev = await vite.createServer({
    root,
    appType: 'spa',
    server: { middlewareMode: true, hmr: { server } },
    clearScreen: false,
    logLevel: 'warn',
  });
  const pages: Pages = (req, res, next) => {
    if (isApi(req.path)) return next();
    // Vite needs inline scripts and a socket, which the content policy of the product forbids.
    res.removeHeader('Content-Security-Policy');
    dev.middlewares(req, res, next);
  };
  return { pages, close: () => dev.close() };
}
