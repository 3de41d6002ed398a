import { createServer, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import express from 'express';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { CONTRACT, CONTRACT_HEADER } from '#shared/api/contract.ts';
import { api } from '#shared/api/urls.ts';
import { clockFrom } from '../../server/clock.ts';
import { demandContract } from '../../server/http/contract.ts';
import { toProblem } from '../../server/http/errors.ts';
import { startTestServer, type TestServer } from '../support/server.ts';

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.close());

const ask = (contract?: string) =>
  fetch(server.url + api.health, {
    headers: contract === undefined ? {} : { [CONTRACT_HEADER]: contract },
  });

test('a page that names the contract in force is answered, and a program that names none', async () => {
  expect((await ask(String(CONTRACT))).status).toBe(200);
  expect((await ask()).status).toBe(200);
});

test.each(['0', 'first', '-1', '1.5', '99999999'])('contract %s is refused', async (contract) => {
  const answer = await ask(contract);
  expect(answer.status).toBe(410);
  expect(await answer.json()).toMatchObject({
    type: '/problems/contract-ended',
    title: expect.stringContaining('reload'),
  });
});

test('a contract that was replaced is taken for 90 days, by the clock of the server', async () => {
  const contracts = [
    { number: 1, replacedOn: '2026-09-01' },
    { number: 2, replacedOn: null },
  ];
  const statusAt = async (now: string) => {
    const app = express();
    app.use(demandContract(clockFrom(new Date(now)), contracts));
    app.use((_req, res) => void res.status(200).end());
    app.use(((error, _req, res, _next) => {
      res.status(toProblem(error).kind === 'contract-ended' ? 410 : 500).end();
    }) satisfies express.ErrorRequestHandler);
    const one: Server = createServer(app);
    await new Promise<void>((done) => one.listen(0, '127.0.0.1', done));
    const { port } = one.address() as AddressInfo;
    const answer = await fetch(`http://127.0.0.1:${port}/`, {
      headers: { [CONTRACT_HEADER]: '1' },
    });
    await new Promise((done) => one.close(done));
    return answer.status;
  };
  expect(await statusAt('2026-11-30T20:00:00Z')).toBe(200);
  expect(await statusAt('2026-12-01T00:00:01Z')).toBe(410);
});
