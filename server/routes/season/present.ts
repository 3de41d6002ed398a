import type { Season } from '#shared/api/brewery.ts';
import type { season } from '../../db/schema/season.ts';

export function presentSeason(row: typeof season.$inferSelect, blockedDays: string[]): Season {
  const { id, version, name, revision, brewWeekdays, brewsPerDay } = row;
  return { id, version, name, revision, brewWeekdays, brewsPerDay, blockedDays };
}
