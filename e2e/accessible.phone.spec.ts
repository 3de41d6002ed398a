import { boardAndAll, breweryPages, publicPages } from './support/accessible.ts';
import { expectAccessible } from './support/axe.ts';
import { test } from './support/test.ts';

test.slow();
test.use({ trace: 'off' });

test('public pages are accessible on a phone', ({ page }) => publicPages(page, expectAccessible));

test('the pages of a brewery are accessible on a phone', ({ board, brewery }) =>
  breweryPages(board, brewery, expectAccessible));

test('the board is accessible on a phone, with all that opens on it', ({ board, brewery }) =>
  boardAndAll(board, brewery, expectAccessible));
