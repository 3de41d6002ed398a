import { and, eq } from 'drizzle-orm';
import type { ListedSeason, SeasonCreate } from '#shared/api/brewery.ts';
import type { Member } from '../../auth/whoAsks.ts';
import type { Tx } from '../../db/client.ts';
import { inTransaction } from '../../db/inTransaction.ts';
import { season } from '../../db/schema/season.ts';
import type { Deps } from '../../deps.ts';
import { demandMade, isRepeated } from '../../http/create.ts';
import { invalidField } from '../../problems.ts';
import { loadBoardRows } from '../board/load.ts';
import { writeEntry } from '../board/record.ts';
import { copyInto } from './copy.ts';
import { sortedWeekdays } from './edit.ts';
import { listedSeason } from './list.ts';
import { presentSeason } from './present.ts';

/** A new season, empty or with the plan of another one. It does not become the current one by it. */
export function makeSeason(
  deps: Pick<Deps, 'db' | 'clock'>,
  member: Member,
  { copy, ...body }: SeasonCreate,
): Promise<ListedSeason> {
  return inTransaction(deps.db, async (tx) => {
    const now = deps.clock.now();
    const breweryId = member.brewery.id;
    const wish = { ...body, brewWeekdays: sortedWeekdays(body.brewWeekdays) };
    if (await isThere(tx, breweryId, wish)) return listedSeason(tx, breweryId, body.id);
    const made = await tx
      .insert(season)
      .values({ ...wish, breweryId, createdAt: now })
      .onConflictDoNothing({ target: season.id })
      .returning({ id: season.id });
    demandMade(made);
    const here = { ...member, seasonId: body.id, isArchived: false };
    let what = `Made the season ${body.name}`;
    if (copy) {
      const from = await loadBoardRows(tx, breweryId, copy.seasonId);
      if (!from) throw invalidField('/copy/seasonId', 'Choose one of this brewery’s seasons');
      const { chains, batches } = await copyInto({ tx, member: here, now }, from, copy, wish);
      what += `, copied from ${from.season.name}: ${count(chains, 'shelf', 'shelves')}, ${count(batches, 'batch', 'batches')}`;
    }
    await writeEntry(tx, here, now, {
      kind: 'edit',
      what,
      before: null,
      after: { season: wish },
      touches: [body.id],
    });
    return listedSeason(tx, breweryId, body.id);
  });
}

async function isThere(
  tx: Tx,
  breweryId: string,
  wish: Omit<SeasonCreate, 'copy'>,
): Promise<boolean> {
  const [row] = await tx
    .select()
    .from(season)
    .where(and(eq(season.breweryId, breweryId), eq(season.id, wish.id)));
  return isRepeated(row && presentSeason(row, []), wish);
}

const count = (n: number, one: string, many: string) => `${n} ${n === 1 ? one : many}`;
