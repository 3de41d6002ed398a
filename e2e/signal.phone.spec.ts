import type { Page } from '@playwright/test';
import { cakeThatWaits, PourPage } from './support/pour.ts';
import { expect, test } from './support/test.ts';

/** A phone that writes down when it buzzes, sounds, and keeps its screen awake. */
function rememberSignals(): void {
  const told: string[] = [];
  Object.assign(window, { told });
  Object.assign(navigator, {
    vibrate: () => Boolean(told.push('buzz')),
  });
  const { start } = AudioScheduledSourceNode.prototype;
  AudioScheduledSourceNode.prototype.start = function (when) {
    told.push('tone');
    start.call(this, when);
  };
  const request = () => {
    told.push('awake');
    return Promise.resolve({ release: () => Promise.resolve(void told.push('asleep')) });
  };
  Object.defineProperty(navigator, 'wakeLock', { value: { request } });
}

const told = (page: Page): Promise<string[]> =>
  page.evaluate(() => {
    const all: unknown = Reflect.get(window, 'told');
    return Array.isArray(all) ? all.map(String) : [];
  });

test('the screen stays awake during a run, and the phone calls once when the wort is ready, if wanted', async ({
  board: page,
  brewery,
  db,
}) => {
  await page.addInitScript(rememberSignals);
  const { second } = await cakeThatWaits(brewery, db);
  const pour = new PourPage(page, (on) => on.tap());
  await pour.open(brewery.slug, second);
  expect(await told(page)).toEqual([]);
  await pour.toTheWort();
  await expect.poll(() => told(page)).toEqual(['awake']);

  await pour.log('24,6');
  await expect(pour.verdict()).toContainText('Hold: 2.6 °C too warm');
  await pour.button('Call me when ready').tap();
  await expect(pour.button('Calls when ready')).toHaveAttribute('aria-pressed', 'true');
  expect(await told(page)).toEqual(['awake']);

  await pour.log('21,5');
  await expect(pour.verdict()).toContainText('Pour: inside the window');
  const called = ['awake', 'buzz', 'tone', 'tone', 'tone'];
  await expect.poll(() => told(page)).toEqual(called);
  await pour.log('21,4');
  await expect(page.getByText('All readings (3)')).toBeVisible();
  expect(await told(page)).toEqual(called);

  await page.getByRole('navigation', { name: 'Pages' }).last().getByRole('link').first().tap();
  await expect(page.getByRole('heading', { level: 1, name: 'Today' })).toBeVisible();
  await expect.poll(() => told(page)).toEqual([...called, 'asleep']);
});
