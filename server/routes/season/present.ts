import type { ListedSeason, Season } from '#shared/api/brewery.ts';
import type { season } from '../../db/schema/season.ts';

type SeasonRow = typeof season.$inferSelect;

export function presentSeason(row: SeasonRow, blockedDays: string[]): Season {
  const { id, version, name, revision, brewWeekdays, brewsPerDay, firstDay, lastDay } = row;
  const isArchived = row.archivedAt !== null;
  return {
    id,
    version,
    name,
    revision,
    brewWeekdays,
    brewsPerDay,
    blockedDays,
    firstDay,
    lastDay,
    isArchived,
  };
}

export function presentListed(
  row: SeasonRow,
  rest: Pick<ListedSeason, 'isCurrent' | 'chains' | 'batches'>,
): ListedSeason {
  const { revision: _, blockedDays: __, ...season } = presentSeason(row, []);
  return { ...season, ...rest };
}
