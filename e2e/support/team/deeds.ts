import { randomUUID } from 'node:crypto';
import type { Page } from '@playwright/test';
import type { BatchCreate } from '#shared/api/batch.ts';
import { board } from '#shared/api/board.ts';
import { talk } from '#shared/api/comment.ts';
import { api } from '#shared/api/urls.ts';
import { ask, send, type Teammate } from './teammate.ts';

/** A busy machine draws slowly, and what one wanted to touch may be gone. */
const REACH = { timeout: 3_000 };

/** Each resolves to whether it was sent; what became of it is in the ledger. */
type Deed = (mate: Teammate) => Promise<boolean>;

/** The name of some batch in sight. */
async function someBatch({ page, chance }: Teammate): Promise<string | undefined> {
  const names = await page.locator('[data-batch] h3').allTextContents();
  return chance.pick(names);
}

const byMenu: Deed = async (mate) => {
  const { page, chance } = mate;
  const name = await someBatch(mate);
  if (name === undefined) return false;
  await page.getByRole('button', { name: `Move ${name}`, exact: true }).click(REACH);
  const places = page
    .getByRole('dialog')
    .getByRole('button', { name: /^Put here: (?!a new shelf)/ });
  await places.first().waitFor(REACH);
  await places.nth(chance.below(await places.count())).click(REACH);
  return true;
};

const byKeys: Deed = async (mate) => {
  const { page, chance } = mate;
  const name = await someBatch(mate);
  if (name === undefined) return false;
  await page.getByRole('button', { name: `Lift ${name}`, exact: true }).focus(REACH);
  await page.keyboard.press('Space');
  for (let step = chance.below(4) + 1; step > 0; step -= 1) await page.keyboard.press('ArrowDown');
  await page.keyboard.press(chance.below(5) === 0 ? 'Escape' : 'Enter');
  // Put down on a new shelf, its yeast is asked for.
  await closeAll(page);
  return true;
};

let written = 0;
/** Words that nobody wrote before. */
const newWords = ({ name }: Teammate) => `${name} ${(written += 1)}`;

const editByForm: Deed = async (mate) => {
  const { page } = mate;
  const name = await someBatch(mate);
  if (name === undefined) return false;
  await page.getByRole('button', { name, exact: true }).first().click(REACH);
  const form = page.getByRole('dialog', { name: `Edit ${name}` });
  await form.getByLabel('Style', { exact: true }).fill(newWords(mate), REACH);
  await form.getByRole('button', { name: 'Save', exact: true }).click(REACH);
  await form.waitFor({ state: 'hidden', ...REACH }).catch(() => undefined);
  await closeAll(page);
  return true;
};

const readBoard = async (mate: Teammate) =>
  board.safeParse((await ask(mate, { method: 'GET', url: api.board(mate.place) })).content).data;

const edit: Deed = async (mate) => {
  const row = mate.chance.pick((await readBoard(mate))?.batches ?? []);
  if (!row) return false;
  const body = { style: newWords(mate), ibu: 10 + mate.chance.below(60) };
  // Sent again it would meet its own version: whether it was done, the record tells.
  await ask(mate, {
    method: 'PATCH',
    url: api.batch(mate.place, row.id),
    body,
    version: row.version,
  });
  return true;
};

const undo: Deed = async ({ page, chance }) => {
  const word = chance.below(4) === 0 ? 'Redo' : 'Undo';
  const button = page.getByRole('button', { name: new RegExp(`^${word}: `) });
  if ((await button.getAttribute('aria-disabled', REACH)) === 'true') return false;
  await button.click(REACH);
  return true;
};

/** A guest's own change is undone with the answer at hand; elsewhere a board tells which is newest. */
const undoAsGuest: Deed = async (mate) => {
  const newest = (await readBoard(mate))?.undo;
  if (!newest) return false;
  await ask(mate, { method: 'POST', url: api.undo(mate.place), body: { changeId: newest.id } });
  return true;
};

const addBatch: Deed = async (mate) => {
  const body: BatchCreate = { ...PLAIN, id: randomUUID(), name: `Added ${newWords(mate)}` };
  await send(mate, { method: 'POST', url: api.batches(mate.place), body });
  return true;
};

const PLAIN: Omit<BatchCreate, 'id' | 'name'> = {
  style: '',
  volumeL: 23,
  og: 1.05,
  fg: 1.012,
  srm: 9,
  ibu: 25,
  fermentC: 20,
  daysUnderBeer: 14,
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
};

const say: Deed = async (mate) => {
  if (!mate.chainPage) return false;
  const field = mate.chainPage.getByLabel('Write to the chain');
  await field.fill(newWords(mate), REACH);
  const button = mate.chainPage.getByRole('button', { name: 'Send', exact: true });
  // Without a connection it is off.
  if (await button.isDisabled(REACH)) return false;
  await button.click(REACH);
  return true;
};

const chainOf = (page: Page) => new URL(page.url()).pathname.split('/').at(-1) ?? '';

const sayBySending: Deed = async (mate) => {
  if (!mate.chainPage) return false;
  const body = { id: randomUUID(), about: { kind: 'chain' }, text: newWords(mate) };
  const url = api.comments(mate.place, chainOf(mate.chainPage));
  await send(mate, { method: 'POST', url, body });
  return true;
};

const changeWhatWasSaid: Deed = async (mate) => {
  if (!mate.chainPage) return false;
  const chainId = chainOf(mate.chainPage);
  const url = api.comments(mate.place, chainId);
  const said = talk.safeParse((await ask(mate, { method: 'GET', url })).content).data;
  const own = said?.comments.filter(({ by, text }) => text !== null && by.name === mate.name);
  const one = mate.chance.pick(own ?? []);
  if (!one) return false;
  const at = { url: api.comment(mate.place, chainId, one.id), version: one.version };
  await (mate.chance.below(3) === 0
    ? ask(mate, { method: 'DELETE', ...at })
    : ask(mate, { method: 'PATCH', ...at, body: { text: newWords(mate) } }));
  return true;
};

/** What a brewer does, some of it more often. */
export const MEMBER_DEEDS = {
  'move by menu': { deed: byMenu, weight: 6 },
  'move by keys': { deed: byKeys, weight: 3 },
  'edit by form': { deed: editByForm, weight: 3 },
  edit: { deed: edit, weight: 3 },
  undo: { deed: undo, weight: 4 },
  add: { deed: addBatch, weight: 1 },
  say: { deed: say, weight: 2 },
  'say by sending': { deed: sayBySending, weight: 2 },
  'change what was said': { deed: changeWhatWasSaid, weight: 2 },
} as const;

export const GUEST_DEEDS = {
  'move by menu': { deed: byMenu, weight: 5 },
  'edit by form': { deed: editByForm, weight: 3 },
  edit: { deed: edit, weight: 2 },
  undo: { deed: undoAsGuest, weight: 3 },
} as const;

/** Closes whatever is open and puts back what is lifted, as somebody does who changed their mind. */
export async function closeAll(page: Page): Promise<void> {
  for (let tries = 0; tries < 4; tries += 1) {
    const open = page.locator('dialog[open], [data-lifting]');
    if ((await open.count()) === 0) return;
    const leave = page.getByRole('button', { name: 'Leave without saving', exact: true });
    if (await leave.first().isVisible())
      await leave
        .first()
        .click(REACH)
        .catch(() => undefined);
    else await page.keyboard.press('Escape');
    await page.waitForTimeout(50);
  }
}

/** One deed, chosen by chance; one that was begun in vain leaves nothing open. */
export async function doSomething(mate: Teammate): Promise<void> {
  const deeds: Record<string, { deed: Deed; weight: number }> = mate.isGuest
    ? GUEST_DEEDS
    : MEMBER_DEEDS;
  const many = Object.entries(deeds).flatMap(([name, { deed, weight }]) =>
    Array.from({ length: weight }, () => ({ name, deed })),
  );
  const chosen = mate.chance.pick(many);
  if (!chosen) return;
  const wasDone = await chosen.deed(mate).catch(() => false);
  if (!wasDone) await closeAll(mate.page);
  const count = mate.deeds.get(chosen.name) ?? { done: 0, vain: 0 };
  mate.deeds.set(chosen.name, {
    done: count.done + Number(wasDone),
    vain: count.vain + Number(!wasDone),
  });
}
