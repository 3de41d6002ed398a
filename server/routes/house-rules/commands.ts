import { and, desc, eq, inArray, sql } from 'drizzle-orm';
import { isDeepStrictEqual } from 'node:util';
import type { HouseRuleChanges } from '#shared/api/board.ts';
import type { HouseRulesRow } from '#shared/api/houseRules.ts';
import { tellHouseRules } from '#shared/record/houseRules.ts';
import { HOUSE_RULES, type HouseRuleKey } from '#shared/rules/houseRules.ts';
import type { Db, Tx } from '../../db/client.ts';
import { houseRules, type brewery } from '../../db/schema/brewery.ts';
import { change } from '../../db/schema/change.ts';
import { person } from '../../db/schema/people.ts';
import { season } from '../../db/schema/season.ts';
import { demandWritten } from '../../db/inTransaction.ts';
import { demandVersion } from '../../http/etag.ts';
import type { Command } from '../board/changeBoard.ts';
import { presentEntry } from '../record/present.ts';

type Brewery = Pick<typeof brewery.$inferSelect, 'id' | 'timeZone'>;

/** Changes that are told; older ones are in the record. */
const TOLD = 50;

export async function readHouseRules(
  db: Db | Tx,
  { id, timeZone }: Brewery,
): Promise<HouseRulesRow> {
  const [row] = await db.select().from(houseRules).where(eq(houseRules.breweryId, id));
  const seasons = db.select({ id: season.id }).from(season).where(eq(season.breweryId, id));
  const past = await db
    .select({ change, name: person.name })
    .from(change)
    .innerJoin(person, eq(person.id, change.personId))
    .where(
      and(
        inArray(change.seasonId, seasons),
        sql`${change.touches} @> array[${id}::uuid]`,
        // The brewery's own facts are under the same id.
        sql`${change.after} -> 'rows' ? 'house_rules'`,
      ),
    )
    .orderBy(desc(change.seq))
    .limit(TOLD);
  return {
    version: row?.version ?? 1,
    changes: row?.changes ?? {},
    history: past.map((each) => {
      const {
        id: changeId,
        at,
        day,
        what,
        facts,
      } = presentEntry({ ...each, lastKind: null }, timeZone);
      return { id: changeId, at, day, by: each.name, what, facts };
    }),
  };
}

/** A limit at its default is no change; so with an empty list of softened rules. */
export function withoutDefaults(wish: HouseRuleChanges): HouseRuleChanges {
  const { softened, ...limits } = wish;
  const changed = Object.entries(limits).filter(
    ([key, value]) => value !== undefined && value !== HOUSE_RULES[key as HouseRuleKey].default,
  );
  return {
    ...Object.fromEntries(changed),
    ...(softened && softened.length > 0 && { softened: [...new Set(softened)].toSorted() }),
  };
}

/** The brewery's id stands for its house rules in the record. */
export const changeHouseRules =
  (version: number, wish: HouseRuleChanges): Command =>
  async ({ tx, board, member }) => {
    const { id, timeZone, units } = member.brewery;
    const current = await readHouseRules(tx, { id, timeZone });
    demandVersion(version, current.version, current);
    const changes = withoutDefaults(wish);
    if (isDeepStrictEqual(changes, current.changes)) return null;
    const written = await tx
      .insert(houseRules)
      .values({ breweryId: id, changes, version: 2 })
      .onConflictDoUpdate({
        target: houseRules.breweryId,
        set: { changes, version: sql`${houseRules.version} + 1` },
        setWhere: eq(houseRules.version, current.version),
      })
      .returning({ version: houseRules.version });
    demandWritten(written);
    return { ...tellHouseRules(board.houseRules, changes, units), touches: [id] };
  };
