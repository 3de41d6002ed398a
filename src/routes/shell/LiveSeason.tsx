import { useBrewery } from '../../app/useBrewery.ts';
import { useLiveSeason } from '../../live/useLiveSeason.ts';

/** Draws nothing: keeps what the pages show up to date with everybody else's changes. */
export function LiveSeason() {
  useLiveSeason(useBrewery().slug);
  return null;
}
