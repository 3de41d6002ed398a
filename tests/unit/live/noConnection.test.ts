import { afterEach, expect, it, vi } from 'vitest';
import { z } from 'zod';
import { request, requestNothing } from '../../../src/api/client.ts';
import { OfflineError, sentenceOf } from '../../../src/api/errors.ts';

afterEach(() => void vi.unstubAllGlobals());

/** What is told where the network has no answer at all, or breaks off in the middle of one. */
async function told(ask: () => Promise<unknown>) {
  const sentences: string[] = [];
  const broken = { ok: true, json: () => Promise.reject(new TypeError('network error')) };
  for (const fetch of [() => Promise.reject(new TypeError('Failed')), async () => broken]) {
    vi.stubGlobal('fetch', fetch);
    const error: unknown = await ask().catch((reason: unknown) => reason);
    if (error instanceof OfflineError) sentences.push(sentenceOf(error));
  }
  return [...new Set(sentences)];
}

it('says of what could not be read that it is not on this device', async () => {
  expect(await told(() => request(z.unknown(), 'GET', '/api/rows'))).toEqual([
    'No connection to the server, and this is not kept on this device.',
  ]);
});

it('says of what could not be written that what was typed is still there', async () => {
  const typed = 'No connection to the server. Nothing was saved; what you typed is still here.';
  expect(await told(() => request(z.unknown(), 'POST', '/api/rows', { body: {} }))).toEqual([
    typed,
  ]);
  expect(await told(() => requestNothing('DELETE', '/api/rows'))).toEqual([typed]);
});
