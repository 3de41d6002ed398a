import { season as seasonContract, type Season } from '#shared/api/brewery.ts';
import { isProblem } from '../../api/errors.ts';
import { useSeasonPatch } from '../../api/season.ts';
import { useBrewery } from '../../app/useBrewery.ts';

/**
 * Blocks and frees single days. If somebody changed the season in the meantime, the same day is
 * blocked or freed in their list: two people who each block a day both have it.
 */
export function useBlockedDays(season: Season) {
  const { slug } = useBrewery();
  const patch = useSeasonPatch(slug);

  const change = async (turn: (days: readonly string[]) => string[]): Promise<boolean> => {
    const attempt = (row: Season) =>
      patch.mutateAsync({
        id: row.id,
        version: row.version,
        patch: { blockedDays: turn(row.blockedDays) },
      });
    try {
      await attempt(season).catch((error: unknown) => {
        const now = isProblem(error, 'changed-since')
          ? seasonContract.safeParse(error.problem.current)
          : null;
        if (!now?.success) throw error;
        return attempt(now.data);
      });
      return true;
    } catch {
      // The mutation holds the error, and the page shows it.
      return false;
    }
  };

  return {
    block: (day: string) => change((days) => [...new Set([...days, day])].toSorted()),
    free: (day: string) => change((days) => days.filter((one) => one !== day)),
    isBusy: patch.isPending,
    error: patch.error,
  };
}
