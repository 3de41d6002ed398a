import { QueryClient, QueryObserver } from '@tanstack/react-query';
import { expect, it } from 'vitest';
import { OfflineError, ProblemError } from '../../../src/api/errors.ts';
import { readFailedAgain } from '../../../src/live/readFailedAgain.ts';

/** A query that is shown and failed with this error; how often it was read. */
async function failed(key: string, error: Error) {
  const client = new QueryClient({ defaultOptions: { queries: { retry: false } } });
  let reads = 0;
  const queryFn = () => {
    reads += 1;
    return reads === 1 ? Promise.reject(error) : Promise.resolve('read');
  };
  const stop = new QueryObserver(client, { queryKey: [key], queryFn }).subscribe(() => undefined);
  await expect.poll(() => client.getQueryState([key])?.status).toBe('error');
  readFailedAgain(client);
  // A read begins before this returns, or not at all.
  await expect.poll(() => client.isFetching()).toBe(0);
  stop();
  return { reads, data: client.getQueryData([key]) };
}

const problem = (kind: string, status: number) =>
  new ProblemError({ type: `/problems/${kind}`, title: kind, status });

it('reads a talk again that had no answer, or one of a server that was busy', async () => {
  expect(await failed('talk', new OfflineError())).toEqual({ reads: 2, data: 'read' });
  expect(await failed('talk', problem('busy', 503))).toEqual({ reads: 2, data: 'read' });
});

it('leaves what was refused, and boards, which are caught up with otherwise', async () => {
  expect((await failed('talk', problem('not-found', 404))).reads).toBe(1);
  expect((await failed('board', new OfflineError())).reads).toBe(1);
});
