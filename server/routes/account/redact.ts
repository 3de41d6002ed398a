import { and, eq, isNotNull, isNull, sql } from 'drizzle-orm';
import type { PersonRow } from '../../auth/sessions.ts';
import type { Tx } from '../../db/client.ts';
import { person, session } from '../../db/schema/people.ts';
import { chainGuest } from '../../db/schema/sharing.ts';
import { tell } from '../../live/note.ts';

export const FORMER = 'A former brewer';
/** No argon2id hash: nothing opens it. */
const NO_PASSWORD = 'closed';

/** What they did stays where it was done; who it was is told no more. */
export async function redact(tx: Tx, { id, name }: PersonRow, now: Date): Promise<void> {
  await tx
    .update(chainGuest)
    .set({ withdrawnAt: now })
    .where(
      and(
        eq(chainGuest.personId, id),
        isNotNull(chainGuest.joinedAt),
        isNull(chainGuest.withdrawnAt),
      ),
    );
  await redactAcceptances(tx, id, name);
  await tx
    .update(person)
    .set({
      name: FORMER,
      email: `${id}@closed.invalid`,
      passwordHash: NO_PASSWORD,
      closedAt: now,
      version: sql`${person.version} + 1`,
    })
    .where(eq(person.id, id));
  await tx.delete(session).where(eq(session.personId, id));
  await tell(tx, { kind: 'person', personId: id });
}

/**
 * A hold's acceptance bears the name of who took it on, in the batch and in the record. It is told
 * from a namesake's by its moment: that of an entry of theirs.
 */
async function redactAcceptances(tx: Tx, personId: string, name: string): Promise<void> {
  await tx.execute(sql`select set_config('barmkin.redacting', 'on', true)`);
  const { rows } = await tx.execute<{ at: string }>(sql`
    select distinct a.value ->> 'at' as at
    from change c, jsonb_path_query(c.after, 'strict $.**.acceptance ? (@.by == $name)',
      jsonb_build_object('name', ${name}::text)) a(value)
    where c.person_id = ${personId} and (a.value ->> 'at')::timestamptz = c.at`);
  for (const { at } of rows) {
    const was = sql`${`"at": ${JSON.stringify(at)}, "by": `} || to_jsonb(${name}::text)::text`;
    const is = sql`${`"at": ${JSON.stringify(at)}, "by": `} || to_jsonb(${FORMER}::text)::text`;
    const replaced = (column: string) =>
      sql`replace(${sql.identifier(column)}::text, ${was}, ${is})::jsonb`;
    await tx.execute(sql`
      update batch set acceptance = ${replaced('acceptance')} where acceptance ->> 'at' = ${at}`);
    await tx.execute(sql`
      update change set before = ${replaced('before')}, after = ${replaced('after')}
      where season_id in (select season_id from change where person_id = ${personId})
        and (strpos(before::text, ${was}) > 0 or strpos(after::text, ${was}) > 0)`);
  }
  await tx.execute(sql`select set_config('barmkin.redacting', '', true)`);
}
