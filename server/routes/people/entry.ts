import type { Role } from '#shared/api/people.ts';
import type { Member } from '../../auth/whoAsks.ts';
import type { Tx } from '../../db/client.ts';
import { writeEntry } from '../board/record.ts';

/**
 * Stands in an entry for whom it is about. The name is put in when the record is read, since the
 * record cannot be changed and an account may be closed.
 */
export const WHOM = '{person}';

interface Told {
  what: string;
  personId: string;
  before: Role | null;
  after: Role | null;
}

/** A line of the record on who belongs to the brewery, and as what. */
export async function recordMembership(
  tx: Tx,
  member: Pick<Member, 'brewery' | 'seasonId' | 'person'>,
  at: Date,
  { what, personId, before, after }: Told,
): Promise<void> {
  await writeEntry(tx, member, at, {
    kind: 'edit',
    what,
    before: { role: before },
    after: { role: after, whom: personId },
    touches: [personId],
  });
}
