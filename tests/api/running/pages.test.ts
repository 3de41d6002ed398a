import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { createServer, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import express from 'express';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { builtPages } from '../../../server/pages.ts';

const folder = mkdtempSync(join(tmpdir(), 'barmkin-pages-'));
let server: Server;
let url = '';

beforeAll(async () => {
  mkdirSync(join(folder, 'assets'));
  mkdirSync(join(folder, '.vite'));
  writeFileSync(join(folder, 'index.html'), '<title>Barmkin</title>');
  writeFileSync(join(folder, 'assets/index-abc123.js'), 'export {};');
  writeFileSync(join(folder, '.vite/manifest.json'), '{}');
  writeFileSync(join(folder, 'sw.js'), '');
  writeFileSync(join(folder, 'manifest.webmanifest'), '{}');
  writeFileSync(join(folder, 'icon.svg'), '<svg xmlns="http://www.w3.org/2000/svg"/>');
  const app = express();
  app.use(builtPages(folder));
  app.use((_req, res) => void res.status(404).send('nothing'));
  server = createServer(app);
  await new Promise<void>((done) => server.listen(0, '127.0.0.1', done));
  url = `http://127.0.0.1:${(server.address() as AddressInfo).port}`;
});

afterAll(async () => {
  server.closeAllConnections();
  await new Promise((done) => server.close(done));
  rmSync(folder, { recursive: true, force: true });
});

test.each([
  ['/', 200, 'no-cache', 'text/html'],
  ['/index.html', 200, 'no-cache', 'text/html'],
  ['/b/saltmarsh?batch=1', 200, 'no-cache', 'text/html'],
  ['/assets/index-abc123.js', 200, 'public, max-age=31536000, immutable', 'text/javascript'],
  ['/sw.js', 200, 'no-cache', 'text/javascript'],
  ['/manifest.webmanifest', 200, 'no-cache', 'application/manifest+json'],
  ['/icon.svg', 200, 'public, max-age=3600', 'image/svg+xml'],
])('%s is served with %i and %s', async (path, status, caching, type) => {
  const answer = await fetch(url + path);
  expect(answer.status).toBe(status);
  expect(answer.headers.get('cache-control')).toBe(caching);
  expect(answer.headers.get('content-type')).toContain(type);
});

test.each([
  '/assets/index-old.js',
  '/assets/',
  '/missing.png',
  '/api/nothing',
  '/.vite/manifest.json',
  '/..%2fpackage.json',
])('%s is not there, rather than a page', async (path) => {
  const answer = await fetch(url + path);
  expect(answer.status).toBe(404);
  expect(await answer.text()).not.toContain('<title>Barmkin');
});

test('a page is not an answer to a POST', async () => {
  expect((await fetch(`${url}/b/saltmarsh`, { method: 'POST' })).status).toBe(404);
});
