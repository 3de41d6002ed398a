import { randomUUID } from 'node:crypto';
import { eq } from 'drizzle-orm';
import type { Locator, Page } from '@playwright/test';
import { api } from '#shared/api/urls.ts';
import { cake } from '../../server/db/schema/cake.ts';
import { batch } from '../../server/db/schema/chain.ts';
import type { Db } from '../../server/db/client.ts';
import { dayFromToday } from './days.ts';
import { expect, type Brewing } from './test.ts';

/** A blonde that was racked on the day and whose cake waits, a pale ale for it, and one behind that. */
export async function cakeThatWaits(brewery: Brewing, db: Db, { on = new Date() } = {}) {
  const day = (ahead: number) => dayFromToday(ahead, on);
  const { batches } = await brewery.write({
    shelves: [
      {
        name: 'Clean ale',
        batches: [
          {
            name: 'Creek Blonde',
            brewOn: day(-14),
            stage: 'racked',
            rackedOn: day(0),
            readFg: 1.011,
          },
          { name: 'Ebb Pale', og: 1.052, fg: 1.013, srm: 7, ibu: 38, brewOn: day(0) },
          { name: 'Jetty Amber', og: 1.054, fg: 1.013, srm: 9, ibu: 40, brewOn: day(20) },
        ],
      },
    ],
  });
  const first = batches['Creek Blonde'] ?? '';
  await db
    .insert(cake)
    .values({ batchId: first, state: 'bare' })
    .onConflictDoUpdate({ target: cake.batchId, set: { state: 'bare' } });
  return { first, second: batches['Ebb Pale'] ?? '', third: batches['Jetty Amber'] ?? '' };
}

export const stageOf = async (db: Db, id: string) => {
  const [row] = await db.select().from(batch).where(eq(batch.id, id));
  return row;
};

/** The page of a pour, as a person uses it. `press`: a tap, a click or a key. */
export class PourPage {
  constructor(
    readonly page: Page,
    readonly press: (on: Locator) => Promise<void>,
  ) {}

  open = async (slug: string, batchId: string) => {
    await this.page.goto(`/b/${slug}/pour/${batchId}`);
    await expect(this.page.getByRole('heading', { level: 1 })).toBeVisible();
  };
  button = (name: string | RegExp) => this.page.getByRole('button', { name });
  step = (name: string) =>
    expect(this.page.getByText(new RegExp(`^Step .* ${name}$`))).toBeVisible();
  verdict = () => this.page.locator('[data-verdict][role=status]');
  thermometer = () => this.page.getByLabel('The thermometer shows');

  /** From the beginning to the wort's temperature. */
  async toTheWort(): Promise<void> {
    await this.press(this.button('Begin the pour'));
    await this.step('Finished and racked');
    await this.press(this.button(/^Next/));
    await this.step('Cake check');
    await this.press(this.button(/^Next/));
    await this.step('How much to keep');
    const jar = this.page.getByRole('radio', { name: 'Into a jar' });
    if ((await jar.count()) > 0) await jar.check({ force: true });
    await this.press(this.button(/^Next/));
    await this.step('Clean and sanitised');
    for (const tick of await this.page.getByRole('checkbox').all()) await this.press(tick);
    await this.press(this.button(/^Next/));
    await this.step('Wort temperature');
  }

  async log(text: string): Promise<void> {
    await this.thermometer().fill(text);
    await this.press(this.button('Log'));
  }

  async record(volume: string, gravity: string): Promise<void> {
    const dialog = this.page.getByRole('dialog');
    await dialog.getByLabel('Volume in the vessel').fill(volume);
    await dialog.getByLabel('Original gravity').fill(gravity);
    await this.press(dialog.getByRole('button', { name: 'Record the pour' }));
    await expect(dialog).toBeHidden();
  }

  /** A reading that was taken a while ago, as a telephone would send it late. */
  async readBefore(slug: string, batchId: string, minutes: number, c: number): Promise<void> {
    const url = api.pour(slug, batchId);
    const state = (await (await this.page.request.get(url)).json()) as { run: { id: string } };
    const answer = await this.page.request.post(api.pourReadings(slug, batchId), {
      headers: { 'Sec-Fetch-Site': 'same-origin' },
      data: {
        runId: state.run.id,
        id: randomUUID(),
        c,
        typed: {},
        deviceAt: new Date(Date.now() - minutes * 60_000).toISOString(),
        clockOffsetMs: 0,
      },
    });
    expect(answer.ok(), await answer.text()).toBe(true);
  }
}
