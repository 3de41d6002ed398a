import { and, eq, sql } from 'drizzle-orm';
import { vesselCreate, type VesselCreate, type VesselPatch } from '#shared/api/vessel.ts';
import { tellVessel } from '#shared/record/sentences.ts';
import { vessel } from '../../db/schema/stock.ts';
import { demandMade, isRepeated } from '../../http/create.ts';
import { demandVersion } from '../../http/etag.ts';
import { merged } from '../../http/patch.ts';
import { problem } from '../../problems.ts';
import type { Command } from '../board/changeBoard.ts';
import type { Hand } from '../board/hand.ts';
import { one } from '../board/find.ts';
import { sayerOf } from '../board/sayer.ts';

export const addVessel =
  (body: VesselCreate): Command =>
  async ({ tx, board, member }) => {
    if (
      isRepeated(
        board.vessels.find(({ id }) => id === body.id),
        body,
      )
    )
      return null;
    const values = { ...body, breweryId: member.brewery.id };
    demandMade(
      await tx.insert(vessel).values(values).onConflictDoNothing().returning({ id: vessel.id }),
    );
    return { what: `Added the vessel ${body.name}`, touches: [body.id] };
  };

export const editVessel =
  (id: string, version: number, patch: VesselPatch): Command =>
  async (hand) => {
    const { tx, board, member } = hand;
    const row = one(board.vessels, id);
    demandVersion(version, row.version, row);
    const { id: _, ...fields } = merged(vesselCreate, Object.keys(vesselCreate.shape), row, patch);
    await tx
      .update(vessel)
      .set({ ...fields, version: sql`${vessel.version} + 1` })
      .where(and(eq(vessel.breweryId, member.brewery.id), eq(vessel.id, id)));
    return { ...tellVessel(sayerOf(hand), row, fields), touches: [id] };
  };

export const removeVessel =
  (id: string, version: number): Command =>
  async (hand) => {
    const row = one(hand.board.vessels, id);
    demandVersion(version, row.version, row);
    const users = usersOf(hand, id);
    if (users.length > 0)
      throw problem('in-use', { detail: `${row.name} is used by ${users.join(', ')}` });
    await hand.tx
      .delete(vessel)
      .where(and(eq(vessel.breweryId, hand.member.brewery.id), eq(vessel.id, id)));
    return { what: `Deleted the vessel ${row.name}`, touches: [id] };
  };

/** Names of the shelves and batches that would be left without it. */
function usersOf({ board }: Hand, id: string): string[] {
  return [...board.chains, ...board.batches]
    .filter((user) => user.vesselId === id)
    .map((user) => user.name);
}
