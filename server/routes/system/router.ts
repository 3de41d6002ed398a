import { z } from 'zod';
import { clientError } from '#shared/api/clientError.ts';
import { api } from '#shared/api/urls.ts';
import { schemaState } from '../../db/schemaState.ts';
import { forAnyone } from '../../http/route.ts';
import { problem } from '../../problems.ts';

const state = z.strictObject({ status: z.literal('ok') });
const OK = { status: 'ok' } as const;

const health = forAnyone(
  {
    name: 'health',
    method: 'get',
    path: api.health,
    summary: 'The process is up',
    answer: state,
    status: 200,
  },
  async () => ({ body: OK }),
);

const ready = forAnyone(
  {
    name: 'ready',
    method: 'get',
    path: api.ready,
    summary: 'The database answers, and its schema is this version’s',
    answer: state,
    status: 200,
    problems: ['busy'],
  },
  async ({ pool }) => {
    const { kind } = await schemaState(pool);
    if (kind !== 'current')
      throw problem('busy', { detail: 'The database is not at this version', retryAfter: 5 });
    return { body: OK };
  },
);

const tellFault = forAnyone(
  {
    name: 'tellFault',
    method: 'post',
    path: api.clientErrors,
    summary: 'A fault in a page, for the log',
    body: clientError,
    answer: null,
    status: 204,
    problems: ['too-many'],
  },
  async ({ req, body, tries }) => {
    await tries.count('clientErrorsByAddress', req.ip ?? '');
    req.log.warn({ page: body }, 'Fault in a page');
    return {};
  },
);

export const systemRoutes = [health, ready, tellFault];
