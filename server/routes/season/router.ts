import { eq, sql } from 'drizzle-orm';
import { season as contract, seasonPatch, type SeasonPatch } from '#shared/api/brewery.ts';
import { api } from '#shared/api/urls.ts';
import { tellSeason } from '#shared/record/sentences.ts';
import { blockedDay, season } from '../../db/schema/season.ts';
import { demandVersion } from '../../http/etag.ts';
import { pathOf } from '../../http/pathOf.ts';
import { forMember } from '../../http/route.ts';
import { canEditSeason } from '../../policies.ts';
import { changeBoard, type Command } from '../board/changeBoard.ts';
import { one } from '../board/find.ts';

const editSeason =
  (id: string, version: number, { blockedDays, ...patch }: SeasonPatch): Command =>
  async ({ tx, board }) => {
    const row = one([board.season], id);
    demandVersion(version, row.version, row);
    const { brewWeekdays } = patch;
    await tx
      .update(season)
      .set({
        ...patch,
        ...(brewWeekdays && { brewWeekdays: [...new Set(brewWeekdays)].sort((a, b) => a - b) }),
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

export const seasonRoutes = [
  forMember(
    {
      name: 'editSeason',
      method: 'patch',
      path: pathOf(api.season(':brewery', ':id')),
      summary: 'Change the season’s name, its brew days and its blocked days',
      body: seasonPatch,
      answer: contract,
      status: 200,
      ifMatch: true,
    },
    canEditSeason,
    async (asked, member) => {
      const { id = '' } = asked.params;
      const command = editSeason(id, asked.version, asked.body);
      const board = await changeBoard(asked, member, [], command);
      return { body: board.season, version: board.season.version };
    },
  ),
];
