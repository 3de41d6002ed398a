import { setTimeout as pause } from 'node:timers/promises';
import type { Browser, BrowserContext } from '@playwright/test';
import { board as boardContract } from '#shared/api/board.ts';
import { talk as talkContract } from '#shared/api/comment.ts';
import { api, placeOf } from '#shared/api/urls.ts';
import { writeBrewery, type Member } from './support/brewery.ts';
import { batchRows, placesOf } from './support/rows.ts';
import { sessionCookies } from './support/server.ts';
import { createChance, type Chance } from './support/team/chance.ts';
import { closeAll, doSomething } from './support/team/deeds.ts';
import { createLedger, type Ledger } from './support/team/ledger.ts';
import { test } from './support/team/ownDatabase.ts';
import { expectAllStandsOnce } from './support/team/record.ts';
import {
  boardOn,
  orderOf,
  orderOn,
  saidIn,
  talkOn,
  undoOn,
  wordsOf,
} from './support/team/screens.ts';
import { ask, sendAgain, type Teammate } from './support/team/teammate.ts';
import { expect, watchErrors } from './support/test.ts';

/**
 * Two of a brewery and a guest work on one board at once, by chance, while networks are cut and the
 * database is killed. `BARMKIN_TEAM_MINUTES` makes it longer, `BARMKIN_TEAM_SEED` chooses again what
 * an earlier run chose (who is faster is not chosen).
 */
const MINUTES = Number(process.env.BARMKIN_TEAM_MINUTES ?? 0.4);
const SEED = Number(process.env.BARMKIN_TEAM_SEED ?? Date.now() % 1_000_000);

const SEASON = {
  shelves: [
    {
      name: 'Clean ale',
      batches: ['Creek Blonde', 'Ebb Pale', 'Jetty Amber', 'Samphire Brown'].map(planned),
    },
    { name: 'House ale', batches: ['Reed Bitter', 'Fog Bank', 'Withy Mild'].map(planned) },
  ],
  bench: [{ name: 'Kelp Rye' }, { name: 'Lantern Stout' }],
};

function planned(name: string, place: number) {
  return { name, brewOn: `2027-0${place + 3}-06` };
}

/** Deeds through the menu, the keys and the form, where the rest send a request alone. */
const BY_HAND = ['move by menu', 'move by keys', 'edit by form'];

/** What a browser says of cut networks, of a database that is away, and of changes that met: a batch that left the guest's chain is not there for them. */
const EXPECTED =
  /ERR_(INTERNET_DISCONNECTED|FAILED|NETWORK_CHANGED|INCOMPLETE_CHUNKED_ENCODING|CONNECTION_\w+|EMPTY_RESPONSE)|status of (404|409|412|503)/;

const CUT_MS = 2_000;
const AWAY_MS = 1_500;
/** The longest wait of a browser for its next try, and a few heartbeats. */
const CALM = { timeout: 40_000 };

test('two and a guest, networks that are cut and a database that is killed: all end with the same board', async ({
  own,
  db,
  brewery,
  browser,
}) => {
  test.setTimeout(MINUTES * 60_000 + 240_000);
  process.stdout.write(`team: seed ${SEED}, ${MINUTES} minutes\n`);
  const chance = createChance(SEED);
  const { chains, batches } = await brewery.write(SEASON);
  const shared = chains['Clean ale'] ?? '';
  const guestHome = await writeBrewery(db, 'Estuary Ales');
  const ledger = createLedger();
  const errors: string[] = [];
  const come = (member: Member, of: string, place: string, chainId: string | null) =>
    comeToBoard({ browser, own, ledger, errors, chance }, { member, of, place, chainId });

  const head = await come(brewery.members['head-brewer'], brewery.slug, brewery.slug, shared);
  const brewer = await come(brewery.members.brewer, brewery.slug, brewery.slug, shared);
  const guest = await come(
    guestHome.members['head-brewer'],
    guestHome.slug,
    placeOf(brewery.slug, brewery.seasonId),
    null,
  );
  await welcome(head, guest, { shared, guestSlug: guestHome.slug });
  const mates = [head, brewer, guest];

  let over = false;
  const work = mates.map(async (mate) => {
    while (!over) {
      await doSomething(mate);
      if (mate.unanswered.length > 0) await sendAgain(mate);
      await pause(mate.chance.below(250));
    }
  });
  const weather = { cuts: 0, crashes: 0 };
  const end = Date.now() + MINUTES * 60_000;
  const crashAt = [0.5, ...(MINUTES >= 2 ? [0.25, 0.75] : [])].map(
    (share) => end - share * MINUTES * 60_000,
  );
  const storms = (async () => {
    while (Date.now() < end) {
      await pause(CUT_MS + chance.below(CUT_MS * 2));
      if (Date.now() > Math.min(...crashAt)) {
        crashAt.splice(crashAt.indexOf(Math.min(...crashAt)), 1);
        await own.crashDatabase(AWAY_MS);
        weather.crashes += 1;
      } else {
        const cut = chance.pick(mates)?.page.context();
        await cut?.setOffline(true);
        await pause(CUT_MS / 2 + chance.below(CUT_MS));
        await cut?.setOffline(false);
        weather.cuts += 1;
      }
    }
  })();
  await storms;
  over = true;
  await Promise.all(work);

  for (const mate of mates) {
    await closeAll(mate.page);
    await expect
      .poll(async () => (await sendAgain(mate)).map(({ status }) => status), CALM)
      .toEqual([]);
  }
  await ledger.settled();
  tell(mates, ledger, weather);
  await expectSameEverywhere(mates);
  await expectEveryBatchOnce();
  await expectAllStandsOnce({
    db,
    seasonId: brewery.seasonId,
    breweryId: brewery.id,
    answered: ledger.answered,
  });
  expect(weather.crashes).toBeGreaterThan(0);
  expect(weather.cuts).toBeGreaterThan(0);
  for (const { name, deeds } of mates) {
    const counts = [...deeds.values()];
    const done = counts.reduce((sum, each) => sum + each.done, 0);
    const vain = counts.reduce((sum, each) => sum + each.vain, 0);
    // In a short run a cut, or nothing said yet that could be changed, weighs too much for more.
    const least = MINUTES >= 2 ? vain : 0;
    expect(done, `${name} was not kept from working`).toBeGreaterThan(least);
    const byHand = BY_HAND.reduce((sum, deed) => sum + (deeds.get(deed)?.done ?? 0), 0);
    expect(byHand, `${name} moved or edited on the page itself`).toBeGreaterThan(0);
  }
  for (const { page } of mates) await page.context().close();
  expect(errors.filter((text) => !EXPECTED.test(text))).toEqual([]);

  async function expectEveryBatchOnce() {
    const rows = await batchRows(db, brewery.id);
    for (const places of placesOf(rows)) expect(places).toEqual(places.map((_, at) => at));
    // Nobody deletes: those of the beginning are all there, whatever was added.
    expect(rows.map(({ id }) => id)).toEqual(expect.arrayContaining(Object.values(batches)));
  }
});

interface Scene {
  browser: Browser;
  own: Parameters<typeof sessionCookies>[0];
  ledger: Ledger;
  errors: string[];
  chance: Chance;
}

interface Who {
  member: Member;
  /** The brewery on whose board they look. */
  of: string;
  place: string;
  chainId: string | null;
}

async function comeToBoard(
  { browser, own, ledger, errors, chance }: Scene,
  { member, of, place, chainId }: Who,
): Promise<Teammate> {
  const context = await browser.newContext({
    baseURL: own.url,
    viewport: { width: 1440, height: 900 },
    serviceWorkers: 'block',
    locale: 'en-GB',
    timezoneId: 'Europe/London',
  });
  const seen = watchErrors(context);
  context.on('close', () => errors.push(...seen));
  ledger.watch(context);
  await context.addCookies(sessionCookies(own, member.token));
  const page = await context.newPage();
  await page.goto(`/b/${of}`);
  await expect(page.getByRole('banner').getByText('Live', { exact: true })).toBeVisible(CALM);
  const chainPage = chainId === null ? null : await openChain(context, of, chainId);
  return {
    name: chainId === null ? `${member.name}, a guest` : member.name,
    page,
    chainPage,
    place,
    isGuest: chainId === null,
    chance: createChance(chance.below(2 ** 31)),
    unanswered: [],
    deeds: new Map(),
  };
}

async function openChain(context: BrowserContext, slug: string, chainId: string) {
  const page = await context.newPage();
  await page.goto(`/b/${slug}/chains/${chainId}`);
  await expect(page.getByLabel('Write to the chain')).toBeVisible(CALM);
  return page;
}

/** The head brewer invites the guest, who puts the shelf on their own board. */
async function welcome(
  head: Teammate,
  guest: Teammate,
  { shared, guestSlug }: { shared: string; guestSlug: string },
): Promise<void> {
  const invited = await ask(head, {
    method: 'POST',
    url: api.guests(head.place, shared),
    body: { id: crypto.randomUUID(), role: 'brewer' },
  });
  const { token } = invited.content as { token: string };
  const url = api.guestInvitation(token);
  const accepted = await ask(guest, { method: 'POST', url, body: { brewerySlug: guestSlug } });
  expect(accepted.status).toBe(201);
  await guest.page.reload();
  await expect(guest.page.locator('[data-batch]')).toHaveCount(4, CALM);
}

/** Without a reload each screen comes to show what the server has, to the word. */
async function expectSameEverywhere(mates: readonly Teammate[]): Promise<void> {
  for (const mate of mates) {
    const reply = await ask(mate, { method: 'GET', url: api.board(mate.place) });
    const server = boardContract.parse(reply.content);
    const order = Object.fromEntries(
      Object.entries(orderOf(server)).filter(([, ids]) => ids.length > 0),
    );
    await expect
      .poll(async () => orderOn(await boardOn(mate.page)), {
        message: `the order of batches that ${mate.name} sees`,
        ...CALM,
      })
      .toEqual(order);
    const words = wordsOf(server);
    await expect
      .poll(async () => wordsAmiss(await boardOn(mate.page), words), {
        message: `what ${mate.name} reads of each batch`,
        ...CALM,
      })
      .toEqual([]);
    await expectAsReadAnew(mate);
    await expectSameTalk(mate);
  }
}

const wordsAmiss = (
  shown: Awaited<ReturnType<typeof boardOn>>,
  words: ReadonlyMap<string, readonly string[]>,
) =>
  shown.flatMap(({ id, text }) =>
    (words.get(id) ?? ['is not known']).filter((word) => !text.includes(word)),
  );

/** A page that was open all the time says what one that is opened now says: verdicts, cakes, undo. */
async function expectAsReadAnew({ name, page }: Teammate): Promise<void> {
  const fresh = await page.context().newPage();
  await fresh.goto(page.url().split('?')[0] ?? '');
  await expect(fresh.locator('[data-batch]').first()).toBeVisible(CALM);
  await expect
    .poll(async () => [await boardOn(page), await undoOn(page)], {
      message: `${name}'s page, and the same opened anew`,
      ...CALM,
    })
    .toEqual([await boardOn(fresh), await undoOn(fresh)]);
  await expect(page.getByRole('banner').getByText('Live', { exact: true })).toBeVisible(CALM);
  await fresh.close();
}

async function expectSameTalk(mate: Teammate): Promise<void> {
  const { chainPage, name } = mate;
  if (!chainPage) return;
  const chainId = new URL(chainPage.url()).pathname.split('/').at(-1) ?? '';
  const reply = await ask(mate, { method: 'GET', url: api.comments(mate.place, chainId) });
  const said = saidIn(talkContract.parse(reply.content));
  await expect
    .poll(
      async () => {
        const shown = await talkOn(chainPage);
        return shown.map(({ id, text }, at) =>
          said[at]?.id === id && text.includes(said[at].text) ? said[at] : { id, text },
        );
      },
      { message: `the talk that ${name} reads`, ...CALM },
    )
    .toEqual(said);
}

function tell(
  mates: readonly Teammate[],
  { answered, statuses }: Ledger,
  weather: { cuts: number; crashes: number },
): void {
  const deeds = mates.map(
    ({ name, deeds: did }) =>
      `${name}: ${[...did].map(([what, { done, vain }]) => `${what} ${done}+${vain}`).join(', ')}`,
  );
  const kinds = [...statuses].toSorted(([a], [b]) => a - b).map(([status, n]) => `${status}×${n}`);
  process.stdout.write(
    [
      `team: ${answered.length} changes answered (${kinds.join(' ')}), ${weather.cuts} cuts, ${weather.crashes} crashes`,
      ...deeds,
      '',
    ].join('\n'),
  );
}
