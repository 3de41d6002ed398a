import AxeBuilder from '@axe-core/playwright';
import { expect, type Page } from '@playwright/test';

/** No violation of WCAG 2.2 A and AA on the page as it stands now. */
export async function expectAccessible(page: Page, part?: string): Promise<void> {
  const builder = new AxeBuilder({ page }).withTags([
    'wcag2a',
    'wcag2aa',
    'wcag21a',
    'wcag21aa',
    'wcag22aa',
    'best-practice',
  ]);
  const { violations } = await (part === undefined ? builder : builder.include(part)).analyze();
  const told = violations.map(({ id, help, nodes }) => ({
    id,
    help,
    where: nodes.slice(0, 5).map((node) => `${node.target.join(' ')} ${node.failureSummary ?? ''}`),
  }));
  expect(told, 'accessibility violations').toEqual([]);
}
