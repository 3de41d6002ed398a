import type { Batch } from '#shared/api/batch.ts';
import type { Chain } from '#shared/api/chain.ts';
import type { Vessel } from '#shared/api/vessel.ts';
import type { Yeast } from '#shared/api/yeast.ts';
import { UNSETTLED_LINK, type BoardFacts } from '#shared/chain/board.ts';
import { addDays } from '#shared/units/day.ts';

/** Made-up boards for tests and measurements: the same seed always makes the same board. */
export interface BoardSize {
  chains: number;
  perChain: number;
  bench: number;
  seed: number;
}

export const TODAY = '2027-03-01';

export function makeBoard({ chains, perChain, bench, seed }: BoardSize): BoardFacts {
  const random = seeded(seed);
  const yeasts = [makeYeast(1, 'ale'), makeYeast(2, 'lager')];
  const vessels = counted(chains, (at) => makeVessel(at + 1));
  const shelves = counted(chains, (at) =>
    makeChain(at + 1, { position: at, vesselId: vessels[at]?.id ?? null }),
  );
  const shelved = shelves.flatMap((chain, shelf) =>
    counted(perChain, (place) =>
      makeBatch(shelf * perChain + place + 1, {
        ...someBeer(random),
        chainId: chain.id,
        place,
        brewOn: addDays(TODAY, 5 + place * DAYS_UNDER_BEER),
      }),
    ),
  );
  const waiting = counted(bench, (place) =>
    makeBatch(chains * perChain + place + 1, { ...someBeer(random), place }),
  );
  return boardOf({ yeasts, vessels, chains: shelves, batches: [...shelved, ...waiting] });
}

/** A board of given rows; what is not given is plain. */
export function boardOf(parts: Partial<BoardFacts>): BoardFacts {
  return {
    season: {
      id: idOf('season', 1),
      version: 1,
      name: 'Spring season',
      revision: 1,
      brewWeekdays: [6, 7],
      brewsPerDay: 1,
      blockedDays: [],
      firstDay: null,
      lastDay: null,
      isArchived: false,
    },
    today: TODAY,
    houseRules: {},
    yeasts: [makeYeast(1, 'ale')],
    vessels: [],
    chains: [],
    batches: [],
    ...parts,
  };
}

const DAYS_UNDER_BEER = 14;

export function makeYeast(number: number, kind: Yeast['kind']): Yeast {
  const [fermentMinC, fermentMaxC] = kind === 'ale' ? [18, 22] : [8, 14];
  return {
    id: idOf('yeast', number),
    version: 1,
    name: `Creek ${kind} ${number}`,
    kind,
    character: false,
    fermentMinC,
    fermentMaxC,
    pourMinC: null,
    pourMaxC: null,
    neverAboveC: null,
    generationLimit: 7,
    attenuation: 0.75,
    packPrice: 850,
    notes: '',
    typed: {},
  };
}

export function makeVessel(number: number, own: Partial<Vessel> = {}): Vessel {
  return {
    id: idOf('vessel', number),
    version: 1,
    name: `Vessel ${number}`,
    shape: 'bucket',
    capacityL: 32,
    blowOff: false,
    minC: null,
    maxC: null,
    cleanedOn: null,
    notes: '',
    typed: {},
    ...own,
  };
}

export function makeChain(number: number, own: Partial<Chain> = {}): Chain {
  const id = idOf('chain', number);
  return {
    id,
    version: 1,
    name: `Shelf ${number}`,
    yeastId: idOf('yeast', 1),
    vesselId: null,
    lineId: id,
    position: number - 1,
    start: { kind: 'pack', price: 850 },
    ...own,
  };
}

/** A plain pale beer of 23 L, 14 days under beer; on the bench, without a date. */
export function makeBatch(number: number, own: Partial<Batch> = {}): Batch {
  return {
    id: idOf('batch', number),
    version: 1,
    name: `${WATERS[number % WATERS.length] ?? ''} ${number}`,
    style: '',
    volumeL: 23,
    og: 1.046,
    fg: 1.0115,
    srm: 6,
    ibu: 28,
    fermentC: 20,
    daysUnderBeer: DAYS_UNDER_BEER,
    brewOn: null,
    wantedOn: null,
    dryHops: [],
    additions: [],
    allergens: ['gluten'],
    cultures: [],
    trub: 'some',
    vesselId: null,
    yeastId: null,
    notes: '',
    typed: {},
    chainId: null,
    place: 0,
    stage: 'pencilled',
    scrapReason: '',
    read: { volumeL: null, og: null, fg: null, rackedOn: null },
    followed: null,
    cake: null,
    link: UNSETTLED_LINK,
    ...own,
  };
}

/** An id that says what it is of and stays the same from run to run. */
export function idOf(kind: 'season' | 'yeast' | 'vessel' | 'chain' | 'batch', number: number) {
  const first = { season: 'a', yeast: 'b', vessel: 'c', chain: 'd', batch: 'e' }[kind];
  return `${first}0000000-0000-4000-8000-${String(number).padStart(12, '0')}`;
}

const WATERS = ['Slack Water', 'Ebb', 'Spring Tide', 'Mud Flat', 'Samphire', 'Sluice', 'Withy'];

/** A beer between a blonde and an imperial stout; darker ones tend to be stronger. */
function someBeer(random: () => number): Partial<Batch> {
  const weight = random();
  const og = round(1.036 + weight * 0.05, 3);
  const hopped = random() < 0.25;
  return {
    og,
    fg: round(1 + (og - 1) / 4, 4),
    srm: round(3 + weight * 25 + random() * 4, 1),
    ibu: Math.round(15 + weight * 40 + random() * 15),
    dryHops: hopped ? [{ gramsPerLitre: 2, contained: 'loose', timing: 'on-cake' }] : [],
    allergens: random() < 0.1 ? ['gluten', 'milk'] : ['gluten'],
  };
}

const round = (value: number, digits: number): number => Number(value.toFixed(digits));

export const counted = <T>(count: number, make: (at: number) => T): T[] =>
  Array.from({ length: count }, (_, at) => make(at));

/** mulberry32, a small public-domain generator: numbers from 0 to 1 by a seed. */
export function seeded(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4_294_967_296;
  };
}
