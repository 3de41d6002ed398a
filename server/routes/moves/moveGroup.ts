import type { Batch } from '#shared/api/batch.ts';
import type { Moved, MoveRequest } from '#shared/api/move.ts';
import { linkChange } from '#shared/chain/linkChanges.ts';
import { moveBatch, withRows, type MoveResult } from '#shared/chain/move.ts';
import type { Member } from '../../auth/whoAsks.ts';
import type { change } from '../../db/schema/change.ts';
import { ProblemError } from '../../problems.ts';
import type { Hand } from '../board/hand.ts';
import { raiseRevision, writeEntries } from '../board/record.ts';
import { insertChain } from '../chains/commands.ts';
import { moveAsGuest } from '../guests/move.ts';
import { demandNotInHand } from '../pour/inHand.ts';
import { answerAgain, answerMove } from './answer.ts';
import type { Outcome } from './lane.ts';
import { refused, type MadeMove } from './refused.ts';
import { sidesOf, touchesOf } from './standing.ts';
import { storeRows, withNewVersions } from './store.ts';

type Granted = Extract<MoveResult, { ok: true }>;
type Change = typeof change.$inferSelect;

interface After {
  board: Hand['board'];
  /** Rows that the move changes, with their new versions. */
  batches: Batch[];
}

interface Asked {
  member: Member;
  request: MoveRequest;
}

/** Moves made one after the other on the board as it stands under the locks, and stored together. */
export class MoveGroup {
  readonly #hand: Omit<Hand, 'member'>;
  readonly #madeBefore: readonly Change[];
  readonly #outcomes: Outcome<Moved>[] = [];
  readonly #entries: MadeMove[] = [];
  /** Rows as the moves so far leave them, with their new versions. */
  readonly #rows = new Map<string, Batch>();
  /** The board after the moves so far. */
  #board: Hand['board'];

  constructor(hand: Omit<Hand, 'member'>, madeBefore: readonly Change[]) {
    this.#hand = hand;
    this.#board = hand.board;
    this.#madeBefore = madeBefore;
  }

  /** A refusal is one wish's own; anything else that is thrown undoes the whole group. */
  async add(asked: Asked): Promise<void> {
    try {
      this.#outcomes.push({ answer: await this.#make(asked) });
    } catch (error) {
      if (!(error instanceof ProblemError)) throw error;
      this.#outcomes.push({ refusal: error });
    }
  }

  /** Writes what the moves changed; an outcome for each, in their order. */
  async store(): Promise<Outcome<Moved>[]> {
    if (this.#entries.length === 0) return this.#outcomes;
    const { tx, board, now } = this.#hand;
    await Promise.all([
      raiseRevision(tx, board.season.id, this.#entries.length),
      storeRows(this.#hand, [...this.#rows.values()]),
      writeEntries(tx, now, this.#entries),
    ]);
    return this.#outcomes;
  }

  async #make({ member, request }: Asked): Promise<Moved> {
    const board = this.#board;
    const hand = { ...this.#hand, board, member };
    const again = this.#madeBefore.find(({ id }) => id === request.id);
    if (again) return answerAgain(hand, again);
    const result = member.guestOf
      ? moveAsGuest(hand, member.guestOf, request)
      : moveBatch(board, request);
    if (!result.ok) throw await refused(hand, request, result, this.#entries);
    const { what } = result;
    if (result.batches.length === 0) {
      const { revision } = board.season;
      const own = this.#newestOf(member);
      return answerMove(hand, { changeId: request.id, what, revision, ...(own && { own }) });
    }
    const after = afterMove(board, result);
    demandNotInHand(hand, after.board);
    if (request.newChain && result.chains.length > 0)
      await insertChain(hand, request.newChain, '/newChain');
    return answerMove(hand, this.#take({ member, request }, result, after));
  }

  /** What somebody can undo next, where they made a move of this group. */
  #newestOf({ person }: Member): Pick<Moved, 'undo' | 'redo'> | undefined {
    const made = this.#entries.findLast(({ member }) => member.person.id === person.id)?.entry;
    return made && { undo: { id: made.id, what: made.what }, redo: null };
  }

  /** Takes a granted move into the board and the record. */
  #take({ member, request }: Asked, result: Granted, { board: after, batches }: After) {
    const { what, chains, shifted, cleared } = result;
    const before = this.#board;
    for (const row of batches) this.#rows.set(row.id, row);
    this.#board = after;
    const sides = sidesOf(before, after, request.batchId);
    this.#entries.push({
      member,
      entry: {
        id: request.id,
        kind: 'move',
        what,
        before: sides.before,
        after: { ...sides.after, links: [linkChange(before, after, request.batchId)] },
        touches: touchesOf(sides),
      },
    });
    const own = { undo: { id: request.id, what }, redo: null };
    const { revision } = after.season;
    return { changeId: request.id, what, revision, batches, chains, shifted, cleared, own };
  }
}

/** One object for the next move's before and this one's after: what is read of it is read once. */
function afterMove(before: Hand['board'], { batches, chains }: Granted): After {
  const rows = withNewVersions(before, batches);
  const season = { ...before.season, revision: before.season.revision + 1 };
  return { board: { ...before, ...withRows(before, rows, chains), season }, batches: rows };
}
