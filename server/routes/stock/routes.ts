import { forMember } from '../../http/route.ts';
import { canEditYeastsAndVessels } from '../../policies.ts';
import { changeShared } from '../board/changeBoard.ts';
import { one } from '../board/find.ts';
import type { BoardNow } from '../board/hand.ts';
import { stockCommands } from './commands.ts';
import type { Kind, Named } from './kind.ts';

/** Adding, editing and deleting one kind of stock. */
export function stockRoutes<Row extends Named & { version: number }, Create extends Named>(
  kind: Kind<Row, Create>,
) {
  const { word, addresses, row: answer } = kind;
  const name = `${word.charAt(0).toUpperCase()}${word.slice(1)}`;
  const commands = stockCommands(kind);
  const answered = (board: BoardNow, id: string) => {
    const row = one(kind.rowsOf(board), id);
    return { body: row, version: row.version };
  };

  const add = forMember<Create>(
    {
      name: `add${name}`,
      method: 'post',
      path: addresses.all,
      summary: `Add a ${word}`,
      body: kind.create,
      answer,
      status: 201,
      problems: ['already-exists', 'season-archived'],
    },
    canEditYeastsAndVessels,
    async (asked, member) =>
      answered(await changeShared(asked, member, commands.add(asked.body)), asked.body.id),
  );

  const edit = forMember<Partial<Omit<Create, 'id'>>>(
    {
      name: `edit${name}`,
      method: 'patch',
      path: addresses.single,
      summary: `Change a ${word}`,
      body: kind.patch,
      answer,
      status: 200,
      ifMatch: true,
      problems: ['season-archived'],
    },
    canEditYeastsAndVessels,
    async ({ params: { id = '' }, ...asked }, member) => {
      const command = commands.edit(id, asked.version, asked.body);
      return answered(await changeShared(asked, member, command), id);
    },
  );

  const remove = forMember(
    {
      name: `delete${name}`,
      method: 'delete',
      path: addresses.single,
      summary: `Delete a ${word} that nothing uses`,
      answer: null,
      status: 204,
      ifMatch: true,
      problems: ['in-use', 'season-archived'],
    },
    canEditYeastsAndVessels,
    async (asked, member) => {
      await changeShared(asked, member, commands.remove(asked.params.id ?? '', asked.version));
      return {};
    },
  );

  return [add, edit, remove];
}
