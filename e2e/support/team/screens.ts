import type { Page } from '@playwright/test';
import type { Board } from '#shared/api/board.ts';
import type { Talk } from '#shared/api/comment.ts';
import { formatDayShort } from '#shared/units/day.ts';

/** What a page shows of each batch, in order: where it stands, and every word beside it. */
export function boardOn(page: Page): Promise<{ id: string; row: string; text: string }[]> {
  return page.locator('[data-batch]').evaluateAll((nodes) =>
    nodes.map((node) => ({
      id: node.getAttribute('data-batch') ?? '',
      row: node.closest('[data-chain]')?.getAttribute('data-chain') ?? 'bench',
      // Text that the page need not draw, such as that of a shelf far below, is read as well.
      text: (node.textContent ?? '').replaceAll(/\s+/g, ' ').trim(),
    })),
  );
}

/** What undo would take back, as the page says it. */
export const undoOn = (page: Page): Promise<(string | null)[]> =>
  page
    .getByRole('button', { name: /^(Undo|Redo): / })
    .evaluateAll((nodes) => nodes.map((node) => node.getAttribute('aria-label')));

export function talkOn(page: Page): Promise<{ id: string; text: string }[]> {
  return page.locator('[data-comment]').evaluateAll((nodes) =>
    nodes.map((node) => ({
      id: node.getAttribute('data-comment') ?? '',
      text: node.textContent ?? '',
    })),
  );
}

/** The order of the batches on each shelf and on the bench, as the server has it. */
export function orderOf({ chains, batches }: Board): Record<string, string[]> {
  const rows = ['bench', ...chains.map(({ id }) => id)];
  return Object.fromEntries(
    rows.map((row) => [
      row,
      batches
        .filter(({ chainId }) => (chainId ?? 'bench') === row)
        .toSorted((a, b) => a.place - b.place)
        .map(({ id }) => id),
    ]),
  );
}

export function orderOn(shown: Awaited<ReturnType<typeof boardOn>>): Record<string, string[]> {
  const order: Record<string, string[]> = {};
  for (const { id, row } of shown) (order[row] ??= []).push(id);
  return order;
}

/** What must be read beside each batch on a shelf: its name, style, bitterness and day. */
export function wordsOf({ batches }: Board): Map<string, string[]> {
  return new Map(
    batches.map(({ id, name, style, ibu, brewOn, chainId }) => [
      id,
      chainId === null
        ? [name, style]
        : [name, style, `${ibu} IBU`, ...(brewOn === null ? [] : [formatDayShort(brewOn)])],
    ]),
  );
}

export const saidIn = ({ comments }: Talk): { id: string; text: string }[] =>
  comments.map(({ id, text }) => ({ id, text: text ?? 'removed' }));
