import { boardAndAll, breweryPages, publicPages } from './support/accessible.ts';
import { expectAccessible, expectContrast } from './support/axe.ts';
import { test } from './support/test.ts';

// A failure names its elements; a trace of the checker itself would only be heavy.
test.use({ trace: 'off' });

for (const [colorScheme, check] of [
  ['light', expectAccessible],
  ['dark', expectContrast],
] as const)
  test.describe(`in ${colorScheme} colours`, () => {
    test.slow();
    test.use({ colorScheme });

    test('public pages are accessible', ({ page }) => publicPages(page, check));

    test('the pages of a brewery are accessible', ({ board, brewery }) =>
      breweryPages(board, brewery, check));

    test('the board is accessible, with all that opens on it', ({ board, brewery }) =>
      boardAndAll(board, brewery, check));
  });
