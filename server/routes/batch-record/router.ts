import { cakeCheck, cakeCheckWrite } from '#shared/api/cakeCheck.ts';
import { batchRecord } from '#shared/api/reading.ts';
import { api } from '#shared/api/urls.ts';
import type { Asked } from '../../http/operation.ts';
import { pathOf } from '../../http/pathOf.ts';
import { forMember } from '../../http/route.ts';
import { canRead, canWriteRecords } from '../../policies.ts';
import { signCheck, withdrawCheck } from './cakeChecks.ts';
import { instrumentRoutes } from './instrumentsRouter.ts';
import { linesOfARecord } from './lines.ts';
import { readBatchRecord } from './read.ts';

const whole = pathOf(api.batchRecord(':brewery', ':id'));
const check = pathOf(api.cakeCheck(':brewery', ':id'));

const named = ({ params, version }: Asked<unknown>) => ({
  batchId: params.id,
  version,
});

const read = forMember(
  {
    name: 'readBatchRecord',
    method: 'get',
    path: whole,
    summary: 'Readings, notes, events and the cake check of a batch',
    answer: batchRecord,
    status: 200,
  },
  canRead,
  async ({ db, params }, member) => ({ body: await readBatchRecord(db, member, params.id) }),
);

const sign = forMember(
  {
    name: 'signCakeCheck',
    method: 'put',
    path: check,
    summary: 'Judge the cake of a batch; If-Match "0" where nobody has yet',
    body: cakeCheckWrite,
    answer: cakeCheck,
    status: 200,
    ifMatch: true,
    problems: ['in-use', 'season-archived'],
  },
  canWriteRecords,
  async (asked, member) => {
    const body = await signCheck(asked, member, named(asked), asked.body);
    return { body, version: body.version };
  },
);

const withdraw = forMember(
  {
    name: 'withdrawCakeCheck',
    method: 'delete',
    path: check,
    summary: 'Take the judgement of a cake back',
    answer: null,
    status: 204,
    ifMatch: true,
    problems: ['in-use', 'season-archived'],
  },
  canWriteRecords,
  async (asked, member) => {
    await withdrawCheck(asked, member, named(asked));
    return {};
  },
);

export const batchRecordRoutes = [read, ...linesOfARecord, sign, withdraw, ...instrumentRoutes];
