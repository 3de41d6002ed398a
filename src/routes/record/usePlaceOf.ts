import type { RecordEntry } from '#shared/api/record.ts';
import { useBoard, useJudged } from '../../api/board.ts';
import { useBrewery } from '../../app/useBrewery.ts';

export interface Place {
  to: string;
  words: string;
}

/** Where the first thing that a change is about stands now; null: nowhere any more. */
export function usePlaceOf({ touches }: RecordEntry): Place | null {
  const { path } = useBrewery();
  const { batches, chains, yeasts, vessels, season } = useBoard();
  const { links } = useJudged();
  const [id = ''] = touches;
  if (links.has(id)) return { to: `${path()}?link=${id}`, words: 'Open the link' };
  const batch = batches.find((each) => each.id === id);
  if (batch && batch.stage !== 'scrapped')
    return { to: `${path()}?batch=${id}`, words: `Open ${batch.name}` };
  if (chains.some((each) => each.id === id))
    return { to: path(`chains/${id}`), words: 'Open the chain' };
  if (yeasts.some((each) => each.id === id)) return { to: path('yeasts'), words: 'To the yeasts' };
  if (vessels.some((each) => each.id === id))
    return { to: path('vessels'), words: 'To the vessels' };
  if (season.id === id) return { to: path('season'), words: 'To the season' };
  return null;
}
