import type { StageRequest } from '../api/batch.ts';
import { formatDay } from '../units/day.ts';
import { fieldsFor, type Sayer } from './words.ts';

/** A stage set by hand, with what was read: "Brewed Keel on Fri 3 April, 23 L at 1.052". */
export function tellStage(sayer: Sayer, name: string, wish: StageRequest): string {
  const as = fieldsFor(sayer);
  const gravity = as.quantity('gravity')('').say;
  const volume = as.quantity('volume')('').say;
  switch (wish.stage) {
    case 'pencilled':
      return `Put ${name} back to pencilled`;
    case 'fermenting':
      return `Brewed ${name} on ${formatDay(wish.brewedOn)}${read(volume(wish.volumeL), gravity(wish.og))}`;
    case 'racked':
      return `Racked ${name} on ${formatDay(wish.rackedOn)}${read(volume(wish.volumeL), gravity(wish.fg))}`;
    case 'scrapped':
      return wish.reason === '' ? `Scrapped ${name}` : `Scrapped ${name}: ${wish.reason}`;
  }
}

const read = (volume: string | null, gravity: string | null): string => {
  if (volume !== null && gravity !== null) return `, ${volume} at ${gravity}`;
  return volume === null && gravity === null ? '' : `, ${volume ?? gravity ?? ''}`;
};
