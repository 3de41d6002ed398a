import AxeBuilder from '@axe-core/playwright';
import { expect, type Page } from '@playwright/test';

/** Of what passed, one place for each rule is enough to be told. */
const BRIEF: Parameters<AxeBuilder['options']>[0] = { resultTypes: ['violations', 'incomplete'] };
const TAGS = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice'];

/** No violation of WCAG 2.2 A and AA on the page as it stands now, or once there is one. */
export async function expectAccessible(page: Page): Promise<void> {
  await page.locator('h1').first().waitFor({ state: 'attached' });
  const passed = await expectNone(new AxeBuilder({ page }).options(BRIEF).withTags(TAGS));
  expect(passed, 'rules that found something to pass').toBeGreaterThan(0);
}

/**
 * The one rule that a change of colours can break. Under a card in the hand, or words over a drawing,
 * it may be undecided everywhere: then nothing failed, and nothing else is asked.
 */
export async function expectContrast(page: Page): Promise<void> {
  await expectNone(new AxeBuilder({ page }).options(BRIEF).withRules(['color-contrast']));
}

/** @returns how many rules found something and passed it */
async function expectNone(builder: AxeBuilder): Promise<number> {
  // There are no frames here: without the search for them it is twice as fast.
  const { violations, passes, incomplete } = await builder.setLegacyMode().analyze();
  const told = violations.map(({ id, help, nodes }) => ({
    id,
    help,
    where: nodes.slice(0, 5).map((node) => `${node.target.join(' ')} ${node.failureSummary ?? ''}`),
  }));
  expect(told, 'accessibility violations').toEqual([]);
  const lookedAt = passes.length + incomplete.length;
  expect(lookedAt, 'rules that found something to look at').toBeGreaterThan(0);
  return passes.length;
}
