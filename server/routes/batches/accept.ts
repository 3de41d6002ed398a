import { holdsOf, mayBeAccepted } from '#shared/chain/acceptance.ts';
import { judgeBoard } from '#shared/chain/judgeBoard.ts';
import { demandVersion } from '../../http/etag.ts';
import { problem } from '../../problems.ts';
import type { Command } from '../board/changeBoard.ts';
import { one } from '../board/find.ts';
import { writeBatch } from './rows.ts';

/** Takes on a link's holds, with a reason, by the rules as they stand now. */
export const acceptHold =
  (id: string, version: number, reason: string): Command =>
  async ({ tx, board, member, now }) => {
    const row = one(board.batches, id);
    demandVersion(version, row.version, row);
    const judged = judgeBoard(board).links.get(id);
    if (!judged || holdsOf(judged).length === 0)
      throw problem('not-acceptable', { detail: 'Nothing holds here', current: row });
    if (!mayBeAccepted(judged))
      throw problem('not-acceptable', {
        detail:
          'An allergen, a wild culture or an overfull vessel cannot be accepted: declare it, or change the plan',
        current: row,
      });
    const rules = holdsOf(judged);
    const acceptance = { reason, rules, by: member.person.name, at: now.toISOString() };
    await writeBatch(tx, board, id, { acceptance });
    const what = `Accepted the hold under ${row.name}: ${reason}`;
    return { what, touches: [id] };
  };

export const withdrawAcceptance =
  (id: string, version: number): Command =>
  async ({ tx, board }) => {
    const row = one(board.batches, id);
    demandVersion(version, row.version, row);
    if (row.link.acceptance === null) return null;
    await writeBatch(tx, board, id, { acceptance: null });
    return { what: `Took back the acceptance under ${row.name}`, touches: [id] };
  };
