import { eq, sql } from 'drizzle-orm';
import { brewery } from '../../db/schema/brewery.ts';
import { season } from '../../db/schema/season.ts';
import { demandVersion } from '../../http/etag.ts';
import { problem } from '../../problems.ts';
import type { Member } from '../../auth/whoAsks.ts';
import { inTransaction } from '../../db/inTransaction.ts';
import type { Deps } from '../../deps.ts';
import { changeBoard, demandOpen, readBoard, type Command } from '../board/changeBoard.ts';
import { lockBoard, lockSeason } from '../board/locks.ts';
import { raiseRevision, writeEntry } from '../board/record.ts';
import { listedSeason, listSeasons } from './list.ts';

type Scene = Pick<Deps, 'db' | 'clock'>;

/** Puts the season that the address names away, or takes it out again; the current one stays out. */
export async function archive(
  { db, clock }: Scene,
  member: Member,
  version: number,
  away: boolean,
) {
  const { seasonId: id, brewery: owner } = member;
  const command: Command = async ({ tx, board, now }) => {
    const { isArchived, name, ...row } = board.season;
    if (isArchived === away) return null;
    demandVersion(version, row.version, board.season);
    const { isCurrent } = await listedSeason(tx, owner.id, id);
    if (away && isCurrent)
      throw problem('in-use', {
        detail: `${name} is the current season. Make another one current first`,
      });
    await tx
      .update(season)
      .set({ archivedAt: away ? now : null, version: sql`${season.version} + 1` })
      .where(eq(season.id, id));
    return {
      what: away ? `Archived the season ${name}` : `Took the season ${name} out of the archive`,
      before: { isArchived },
      after: { isArchived: away },
      touches: [id],
    };
  };
  await changeBoard({ db, clock }, member, [], command, 'archived-too');
  return listedSeason(db, owner.id, id);
}

/** The brewery's own address shows this season from now on. */
export function makeCurrent({ db, clock }: Scene, member: Member, version: number) {
  return inTransaction(db, async (tx) => {
    const { seasonId: id, brewery: owner } = member;
    // Nobody makes another one current, archives this one or deletes it in the meantime.
    await tx.select({ id: brewery.id }).from(brewery).where(eq(brewery.id, owner.id)).for('update');
    await lockSeason(tx, id);
    const all = await listSeasons(tx, owner.id);
    const row = await listedSeason(tx, owner.id, id);
    if (row.isCurrent) return row;
    demandVersion(version, row.version, row);
    demandOpen({ season: row });
    await tx.update(brewery).set({ currentSeasonId: id }).where(eq(brewery.id, owner.id));
    const before = all.find(({ isCurrent }) => isCurrent);
    for (const each of [before?.id ?? id, id].toSorted()) await raiseRevision(tx, each);
    await writeEntry(tx, member, clock.now(), {
      kind: 'edit',
      what: `Made ${row.name} the current season`,
      before: { current: before?.id ?? null },
      after: { current: id },
      touches: [id],
    });
    return listedSeason(tx, owner.id, id);
  });
}

/** Only one on which nothing stands; what happened in it stays recorded, its deletion in the current one. */
export function deleteSeason({ db, clock }: Scene, member: Member, version: number): Promise<void> {
  return inTransaction(db, async (tx) => {
    const { seasonId: id, brewery: owner } = member;
    await tx.select({ id: brewery.id }).from(brewery).where(eq(brewery.id, owner.id)).for('update');
    await lockBoard(tx, id, 'all');
    const { season: row, chains, batches } = await readBoard(tx, member, clock.now());
    demandVersion(version, row.version, row);
    const all = await listSeasons(tx, owner.id);
    const current = all.find(({ isCurrent }) => isCurrent);
    if (!current || current.id === id)
      throw problem('in-use', { detail: `${row.name} is the current season, so it stays` });
    if (chains.length + batches.length > 0)
      throw problem('in-use', {
        detail: `Something stands on ${row.name}. Archive it, or empty its board first`,
      });
    await tx.delete(season).where(eq(season.id, id));
    await raiseRevision(tx, current.id);
    await writeEntry(tx, { ...member, seasonId: current.id }, clock.now(), {
      kind: 'edit',
      what: `Deleted the season ${row.name}, which was empty`,
      before: { season: row },
      after: null,
      touches: [id],
    });
  });
}
