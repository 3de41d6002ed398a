import type { Board } from '#shared/api/board.ts';
import { boardOf, idOf, makeBatch, makeChain, makeYeast } from '../../support/boards.ts';

export const [ALE, LAGER] = [idOf('chain', 1), idOf('chain', 2)];
const at = (number: number, chainId: string | null, place: number) =>
  makeBatch(number, { chainId, place, name: `Beer ${number}`, yeastId: idOf('yeast', 1) });

/**
 * Two shelves and a bench: Beer 1 (racked), 2, 3 on Harbour ale; 4, 5 on Lantern lager; 6 and 7
 * without a shelf, 7 without a yeast of its own.
 */
export function twoShelves(): Board {
  const facts = boardOf({
    yeasts: [makeYeast(1, 'ale'), makeYeast(2, 'lager')],
    chains: [
      makeChain(1, { name: 'Harbour ale' }),
      makeChain(2, { name: 'Lantern lager', yeastId: idOf('yeast', 2) }),
    ],
    batches: [
      { ...at(1, ALE, 0), stage: 'racked', brewOn: '2027-02-06' },
      { ...at(2, ALE, 1), brewOn: '2027-03-06' },
      { ...at(3, ALE, 2), brewOn: '2027-03-20' },
      { ...at(4, LAGER, 0), brewOn: '2027-03-07' },
      { ...at(5, LAGER, 1), brewOn: '2027-03-27' },
      at(6, null, 0),
      { ...at(7, null, 1), yeastId: null },
    ],
  });
  const able = { editBatches: true, moveBatches: true, moveAcross: true, setStages: true };
  return {
    ...facts,
    brewery: {
      id: '20000000-0000-4000-8000-000000000001',
      slug: 'saltmarsh',
      version: 1,
      name: 'Saltmarsh Brewers',
      timeZone: 'Europe/London',
      currency: 'EUR',
      units: { system: 'metric', gravity: 'sg', colour: 'srm', temperature: 'c' },
    },
    me: {
      personId: '20000000-0000-4000-8000-000000000002',
      role: 'brewer',
      can: {
        ...able,
        editChains: true,
        editYeastsAndVessels: true,
        editSeason: false,
        acceptHolds: false,
        invite: false,
      },
    },
    members: [],
    undo: null,
    redo: null,
    unread: {},
    guests: [],
  };
}

export const beer = (number: number) => idOf('batch', number);
