import { invalidField, notFound } from '../../problems.ts';
import type { BoardNow } from './hand.ts';

/** A row of the board by its id; what is not on it does not exist. */
export function one<T extends { id: string }>(rows: readonly T[], id: string | undefined): T {
  const row = rows.find((each) => each.id === id);
  if (!row) throw notFound();
  return row;
}

/** The yeast and the vessel that a row names must be this brewery's. */
export function demandStock(
  board: BoardNow,
  wish: { yeastId?: string | null | undefined; vesselId?: string | null | undefined },
  at = '',
): void {
  if (wish.yeastId && !board.yeasts.some(({ id }) => id === wish.yeastId))
    throw invalidField(`${at}/yeastId`, 'Choose one of this brewery’s yeasts');
  if (wish.vesselId && !board.vessels.some(({ id }) => id === wish.vesselId))
    throw invalidField(`${at}/vesselId`, 'Choose one of this brewery’s vessels');
}
