import { eq, sql } from 'drizzle-orm';
import type { SeasonPatch } from '#shared/api/brewery.ts';
import { tellSeason } from '#shared/record/sentences.ts';
import { blockedDay, season } from '../../db/schema/season.ts';
import { demandVersion } from '../../http/etag.ts';
import { invalidField } from '../../problems.ts';
import type { Command } from '../board/changeBoard.ts';

export const sortedWeekdays = (days: readonly number[]): number[] =>
  [...new Set(days)].sort((a, b) => a - b);

/** Changes the season that the address names. */
export const editSeason =
  (version: number, { blockedDays, ...patch }: SeasonPatch): Command =>
  async ({ tx, board }) => {
    const row = board.season;
    const { id } = row;
    demandVersion(version, row.version, row);
    const { firstDay, lastDay } = { ...row, ...patch };
    if (firstDay && lastDay && lastDay < firstDay)
      throw invalidField('/lastDay', 'The last day cannot be before the first');
    const { brewWeekdays } = patch;
    await tx
      .update(season)
      .set({
        ...patch,
        ...(brewWeekdays && { brewWeekdays: sortedWeekdays(brewWeekdays) }),
        version: sql`${season.version} + 1`,
      })
      .where(eq(season.id, id));
    if (blockedDays) {
      await tx.delete(blockedDay).where(eq(blockedDay.seasonId, id));
      const days = [...new Set(blockedDays)].map((day) => ({ seasonId: id, day }));
      if (days.length > 0) await tx.insert(blockedDay).values(days);
    }
    const after = { ...row, ...patch, blockedDays: blockedDays?.toSorted() ?? row.blockedDays };
    return { ...tellSeason(row, after), touches: [id] };
  };
