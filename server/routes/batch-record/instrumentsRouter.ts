import { z } from 'zod';
import { instrument, instrumentCreate, instrumentPatch } from '#shared/api/reading.ts';
import { api } from '#shared/api/urls.ts';
import { pathOf } from '../../http/pathOf.ts';
import { forMember } from '../../http/route.ts';
import { canRead, canWriteRecords } from '../../policies.ts';
import { addInstrument, editInstrument, instrumentsOf } from './instruments.ts';

const all = pathOf(api.instruments(':brewery'));
const single = pathOf(api.instrument(':brewery', ':id'));

const list = forMember(
  {
    name: 'listInstruments',
    method: 'get',
    path: all,
    summary: 'What the brewery reads with',
    answer: z.array(instrument),
    status: 200,
  },
  canRead,
  async ({ db }, member) => ({ body: await instrumentsOf(db, member.brewery.id) }),
);

const add = forMember(
  {
    name: 'addInstrument',
    method: 'post',
    path: all,
    summary: 'Add an instrument with its correction',
    body: instrumentCreate,
    answer: instrument,
    status: 201,
    problems: ['already-exists'],
  },
  canWriteRecords,
  async (asked, member) => {
    const body = await addInstrument(asked, member, asked.body);
    return { body, version: body.version };
  },
);

const edit = forMember(
  {
    name: 'editInstrument',
    method: 'patch',
    path: single,
    summary: 'Change an instrument, or put it away; readings that were taken keep their value',
    body: instrumentPatch,
    answer: instrument,
    status: 200,
    ifMatch: true,
  },
  canWriteRecords,
  async (asked, member) => {
    const named = { id: asked.params.id, version: asked.version };
    const body = await editInstrument(asked, member, named, asked.body);
    return { body, version: body.version };
  },
);

export const instrumentRoutes = [list, add, edit];
