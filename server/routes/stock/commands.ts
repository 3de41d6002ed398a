import { demandWritten } from '../../db/inTransaction.ts';
import { demandMade, isRepeated } from '../../http/create.ts';
import { demandVersion } from '../../http/etag.ts';
import { merged } from '../../http/patch.ts';
import { problem } from '../../problems.ts';
import type { Command } from '../board/changeBoard.ts';
import { one } from '../board/find.ts';
import type { BoardNow } from '../board/hand.ts';
import { sayerOf } from '../board/sayer.ts';
import type { Kind, Named } from './kind.ts';

/** The commands of one kind of stock. */
export function stockCommands<Row extends Named & { version: number }, Create extends Named>(
  kind: Kind<Row, Create>,
) {
  const { word, rowsOf } = kind;

  const add =
    (body: Create): Command =>
    async ({ tx, board, member }) => {
      const known = rowsOf(board).find(({ id }) => id === body.id);
      if (isRepeated(known, body)) return null;
      demandMade(await kind.insert(tx, { ...body, breweryId: member.brewery.id }));
      return { what: `Added the ${word} ${body.name}`, touches: [body.id] };
    };

  const edit =
    (id: string, version: number, patch: object): Command =>
    async (hand) => {
      const row = one(rowsOf(hand.board), id);
      demandVersion(version, row.version, row);
      const whole = merged(kind.create, Object.keys(kind.create.shape), row, patch);
      const { id: _, ...fields } = whole;
      const where = { breweryId: hand.member.brewery.id, id, version };
      demandWritten(await kind.update(hand.tx, where, fields));
      return { ...kind.tell(sayerOf(hand), row, fields), touches: [id] };
    };

  const remove =
    (id: string, version: number): Command =>
    async ({ tx, board, member }) => {
      const row = one(rowsOf(board), id);
      demandVersion(version, row.version, row);
      const users = usersOf(board, kind.field, id);
      if (users.length > 0)
        throw problem('in-use', { detail: `${row.name} is used by ${users.join(', ')}` });
      demandWritten(await kind.remove(tx, { breweryId: member.brewery.id, id, version }));
      return { what: `Deleted the ${word} ${row.name}`, touches: [id] };
    };

  return { add, edit, remove };
}

/** Names of the shelves and batches that would be left without it. */
const usersOf = (board: BoardNow, field: 'yeastId' | 'vesselId', id: string): string[] =>
  [...board.chains, ...board.batches].filter((user) => user[field] === id).map(({ name }) => name);
