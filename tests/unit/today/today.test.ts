import { describe, expect, it } from 'vitest';
import type { Batch } from '#shared/api/batch.ts';
import type { TodayFacts } from '#shared/api/today.ts';
import { UNSETTLED_LINK } from '#shared/chain/board.ts';
import { todayList } from '#shared/today/today.ts';
import { dayIn } from '#shared/units/dayIn.ts';
import { boardOf, idOf, makeBatch, makeChain } from '../../support/boards.ts';

const NONE: TodayFacts = {
  now: '2027-03-20T12:00:00.000Z',
  overrides: [],
  runs: [],
  unsigned: [],
  events: [],
  jars: [],
};
const ID = 'f0000000-0000-4000-8000-000000000001';
const LONDON = 'Europe/London';
const HOP = { gramsPerLitre: 4, contained: 'loose', timing: 'after-taking' } as const;

/** One shelf with these batches in their order. */
function shelf(...batches: Partial<Batch>[]) {
  const chain = makeChain(1);
  const rows = batches.map((own, place) =>
    makeBatch(place + 1, { chainId: chain.id, place, name: `Beer ${place + 1}`, ...own }),
  );
  return { ...boardOf({ chains: [chain], batches: rows }), brewery: { timeZone: LONDON } };
}
const list = (board: ReturnType<typeof shelf>, today: string, facts: Partial<TodayFacts> = {}) =>
  todayList(board, { ...NONE, ...facts }, today);
const kinds = (duties: readonly { kind: string; day: string }[]) =>
  duties.map(({ kind, day }) => `${kind} ${day}`);

const FERMENTING: Partial<Batch> = {
  stage: 'fermenting',
  brewOn: '2027-03-06',
  daysUnderBeer: 14,
  cake: { state: 'growing', check: null, measured: null },
};
const PENCILLED: Partial<Batch> = { brewOn: '2027-03-20', daysUnderBeer: 14 };
/** Readings of which only the time of the last counts here. */
const lastRead = (lastAt: string): Partial<Batch> => ({
  ...FERMENTING,
  followed: {
    count: 1,
    lastAt,
    pouredAt: null,
    firstGravity: null,
    firstGravityAt: null,
    gravity: null,
    gravityAt: null,
    steadyFrom: null,
    lowest: null,
    begunAt: null,
    stillAt: null,
    temperatureC: null,
    temperatureAt: null,
  },
});
const one = idOf('batch', 1);
const two = idOf('batch', 2);

describe('a brew day', () => {
  const board = shelf(FERMENTING, PENCILLED);

  it('is racking and pouring on one day, in the order of the work', () => {
    const read = shelf(lastRead('2027-03-19T08:00:00Z'), PENCILLED);
    expect(kinds(list(read, '2027-03-20').due)).toEqual(['rack 2027-03-20', 'brew 2027-03-20']);
  });

  it('is this week from six days before, and not seven', () => {
    expect(kinds(list(board, '2027-03-14').week)).toContain('brew 2027-03-20');
    expect(kinds(list(board, '2027-03-13').week)).not.toContain('brew 2027-03-20');
  });

  it('stays due where it was missed', () => {
    expect(kinds(list(board, '2027-03-25').due)).toContain('brew 2027-03-20');
  });

  it('names the cake that the wort goes onto; the first of a shelf has none', () => {
    const brews = list(shelf(PENCILLED, { brewOn: '2027-03-20' }), '2027-03-20').due;
    expect(brews).toMatchObject([{ ontoId: null }, { ontoId: one }]);
  });

  it('gives way to the pour that is in hand', () => {
    const runs = [{ batchId: two, heldBy: 'Ned Quill', openedAt: '2027-03-20T09:00:00Z' }];
    const { due } = list(board, '2027-03-20', { runs });
    expect(due[0]).toMatchObject({ kind: 'pour-open', heldBy: 'Ned Quill' });
    expect(kinds(due)).not.toContain('brew 2027-03-20');
  });

  it('of a wish on the bench is none', () => {
    const board = shelf({ ...PENCILLED, chainId: null });
    expect(list(board, '2027-03-20')).toMatchObject({ due: [], week: [], next: null });
  });
});

describe('dry hops', () => {
  const hopped = { ...FERMENTING, dryHops: [HOP] };

  it('ask for the yeast first where another beer waits for it', () => {
    const board = shelf(hopped, PENCILLED);
    expect(list(board, '2027-03-17').due).toContainEqual(
      expect.objectContaining({
        kind: 'dry-hop',
        day: '2027-03-17',
        yeastFirst: two,
        isUsualDay: true,
      }),
    );
    expect(list(shelf(hopped), '2027-03-17').due).toContainEqual(
      expect.objectContaining({ kind: 'dry-hop', yeastFirst: null }),
    );
  });

  it('come on the day that was planned for them, once', () => {
    const event = { id: ID, batchId: one, kind: 'dry-hop' as const, text: '' };
    const planned = [{ ...event, plannedOn: '2027-03-15', isDone: false }];
    expect(kinds(list(shelf(hopped), '2027-03-15', { events: planned }).due)).toContain(
      'dry-hop 2027-03-15',
    );
    const done = [{ ...event, plannedOn: '2027-03-15', isDone: true }];
    expect(kinds(list(shelf(hopped), '2027-03-18', { events: done }).due)).not.toContain(
      'dry-hop 2027-03-17',
    );
  });

  it('wait for a yeast that is planned to be taken later, by having it taken with them', () => {
    const later = { ...PENCILLED, link: { ...UNSETTLED_LINK, takenOn: '2027-03-19' } };
    const { due } = list(shelf(hopped, later), '2027-03-17');
    expect(due.map(({ kind }) => kind).filter((kind) => kind !== 'reading')).toEqual([
      'take-yeast',
      'dry-hop',
    ]);
  });

  it('are forgotten once the beer is racked', () => {
    const racked = {
      ...hopped,
      stage: 'racked' as const,
      read: { volumeL: null, og: null, fg: null, rackedOn: '2027-03-19' },
    };
    expect(kinds(list(shelf(racked), '2027-03-20').due)).toEqual([]);
  });
});

describe('readings', () => {
  const board = shelf(FERMENTING);
  const readAt = (at: string, today: string) => list(shelf(lastRead(at)), today).due;

  it('are overdue three days after the last, or after the brew day', () => {
    expect(list(board, '2027-03-09').due).toMatchObject([{ kind: 'reading', lastOn: null }]);
    expect(kinds(readAt('2027-03-10T12:00:00Z', '2027-03-12'))).toEqual([]);
    expect(kinds(readAt('2027-03-10T12:00:00Z', '2027-03-13'))).toEqual(['reading 2027-03-13']);
  });

  it('count the days of the brewery, over midnight and over the change to summer time', () => {
    // London is at UTC until 01:00 on 28 March 2027, and an hour ahead from then on.
    const dayOf = (at: string) =>
      readAt(at, '2027-04-10').find(({ kind }) => kind === 'reading')?.day;
    expect(dayOf('2027-03-27T23:30:00Z')).toBe('2027-03-30');
    expect(dayOf('2027-03-28T22:30:00Z')).toBe('2027-03-31');
    expect(dayOf('2027-03-28T23:30:00Z')).toBe('2027-04-01');
  });
});

describe('what waits for an answer', () => {
  it('comes first, and for as long as nobody answers', () => {
    const board = shelf(FERMENTING, PENCILLED);
    const { due } = list(board, '2027-03-21', {
      overrides: [
        {
          id: ID,
          batchId: two,
          askedBy: 'Ned Quill',
          askedAt: '2027-03-20T23:50:00Z',
          holds: 'Too warm',
        },
      ],
      unsigned: [{ batchId: one, at: '2027-03-06T12:00:00Z' }],
    });
    expect(due.slice(0, 2).map(({ kind }) => kind)).toEqual(['signature', 'override']);
  });

  it('of a batch of another season is not listed', () => {
    const elsewhere = [{ batchId: idOf('batch', 99), at: '2027-03-06T12:00:00Z' }];
    expect(list(shelf(), '2027-03-20', { unsigned: elsewhere }).due).toEqual([]);
  });
});

describe('after racking', () => {
  const racked: Partial<Batch> = {
    stage: 'racked',
    brewOn: '2027-03-06',
    read: { volumeL: null, og: null, fg: null, rackedOn: '2027-03-20' },
    cake: { state: 'bare', check: null, measured: null },
  };

  it('the cake is judged for the next beer, once', () => {
    const board = shelf(racked, { ...PENCILLED, brewOn: '2027-04-20' });
    expect(list(board, '2027-03-20').due).toMatchObject([{ kind: 'cake-check', forId: two }]);
    const judged = {
      ...racked,
      cake: { state: 'bare', check: { judged: 'fit', tasted: 'clean' }, measured: null },
    } as const;
    expect(list(shelf(judged, { ...PENCILLED, brewOn: '2027-04-20' }), '2027-03-20').due).toEqual(
      [],
    );
    expect(list(shelf(racked), '2027-03-20').due).toEqual([]);
  });

  it('what is left of a cake is put away', () => {
    const jars = [{ id: ID, batchId: one, day: '2027-03-20', volumeL: 0.8, generation: 2 }];
    expect(list(shelf(racked), '2027-03-21', { jars }).due).toMatchObject([
      { kind: 'jar', volumeL: 0.8 },
    ]);
  });
});

describe('an empty week', () => {
  it('says what comes next, and when', () => {
    const board = shelf({ brewOn: '2027-05-01', daysUnderBeer: 14 }, { brewOn: '2027-05-15' });
    expect(list(board, '2027-03-20')).toMatchObject({
      due: [],
      week: [],
      next: { kind: 'brew', day: '2027-05-01', batchId: one },
    });
  });

  it('that is not empty names no next', () => {
    expect(
      list(shelf({ brewOn: '2027-03-21' }, { brewOn: '2027-05-15' }), '2027-03-20').next,
    ).toBeNull();
  });
});

describe('the day of a place', () => {
  // Offsets of the zones from the IANA time zone database: New York −5 h, −4 h from 07:00 UTC on
  // 14 March 2027; Auckland +13 h until 4 April 2027, then +12 h.
  it.each([
    ['America/New_York', '2027-03-14T04:59:00Z', '2027-03-13'],
    ['America/New_York', '2027-03-14T05:00:00Z', '2027-03-14'],
    ['America/New_York', '2027-03-15T03:59:00Z', '2027-03-14'],
    ['America/New_York', '2027-03-15T04:00:00Z', '2027-03-15'],
    ['Pacific/Auckland', '2027-04-02T11:00:00Z', '2027-04-03'],
    ['Pacific/Auckland', '2027-04-04T11:59:00Z', '2027-04-04'],
    ['Pacific/Auckland', '2027-04-04T12:00:00Z', '2027-04-05'],
    [LONDON, '2027-10-31T23:30:00Z', '2027-10-31'],
    [LONDON, '2027-06-30T23:30:00Z', '2027-07-01'],
  ])('%s at %s is %s', (zone, at, day) => {
    expect(dayIn(zone, new Date(at))).toBe(day);
  });
});
