import type { z } from 'zod';
import type { Member } from '../../auth/whoAsks.ts';
import type { Asked } from '../../http/operation.ts';
import { forMember } from '../../http/route.ts';
import { canWriteRecords } from '../../policies.ts';
import type { LineNamed, Scene } from './scene.ts';

interface Words {
  name: string;
  summary: string;
}

/** One kind of line in a batch's record: a reading, a note, an event. */
interface Line<Row extends { version: number }, Create, Write> {
  addresses: { all: string; single: string };
  /** What the address calls the id of one. */
  param: string;
  words: { add: Words; edit: Words; remove: Words };
  row: z.ZodType<Row>;
  create: z.ZodType<Create>;
  write: z.ZodType<Write>;
  add(scene: Scene, member: Member, batchId: string | undefined, body: Create): Promise<Row>;
  edit(scene: Scene, member: Member, named: LineNamed, body: Write): Promise<Row>;
  remove(scene: Scene, member: Member, named: LineNamed): Promise<null>;
}

/** Adding, changing and deleting one kind of line. */
export function lineRoutes<Row extends { version: number }, Create, Write>(
  line: Line<Row, Create, Write>,
) {
  const { addresses, words } = line;
  const problems = ['in-use', 'season-archived'] as const;
  const named = ({ params, version }: Asked<unknown>): LineNamed => ({
    batchId: params.id,
    id: params[line.param] ?? '',
    version,
  });
  const answered = (body: Row) => ({ body, version: body.version });

  const add = forMember<Create>(
    {
      ...words.add,
      method: 'post',
      path: addresses.all,
      body: line.create,
      answer: line.row,
      status: 201,
      problems: ['already-exists', ...problems],
    },
    canWriteRecords,
    async (asked, member) => answered(await line.add(asked, member, asked.params.id, asked.body)),
  );

  const edit = forMember<Write>(
    {
      ...words.edit,
      method: 'put',
      path: addresses.single,
      body: line.write,
      answer: line.row,
      status: 200,
      ifMatch: true,
      problems,
    },
    canWriteRecords,
    async (asked, member) => answered(await line.edit(asked, member, named(asked), asked.body)),
  );

  const remove = forMember(
    {
      ...words.remove,
      method: 'delete',
      path: addresses.single,
      answer: null,
      status: 204,
      ifMatch: true,
      problems,
    },
    canWriteRecords,
    async (asked, member) => {
      await line.remove(asked, member, named(asked));
      return {};
    },
  );

  return [add, edit, remove];
}
