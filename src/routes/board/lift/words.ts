import type { BoardFacts } from '#shared/chain/board.ts';
import type { Gap } from '#shared/chain/gaps.ts';
import { capital } from '#shared/rules/words.ts';
import { formatDay, formatDayShort } from '#shared/units/day.ts';
import { indexed } from './indexed.ts';

const nameOf = (rows: readonly { id: string; name: string }[], id: string | null) =>
  rows.find((row) => row.id === id)?.name ?? '';

export const batchName = (board: BoardFacts, id: string) => nameOf(board.batches, id);

export const plural = (count: number, one: string, many: string) =>
  `${count} ${count === 1 ? one : many}`;

/** "Pour", "Mind 2", "Hold 1": the verdict with the number of its findings. */
export function gapWord(gap: Pick<Gap, 'verdict' | 'holds' | 'minds'>): string {
  switch (gap.verdict) {
    case 'pour':
      return 'Pour';
    case 'mind':
      return `Mind ${gap.minds}`;
    case 'hold':
      return `Hold ${gap.holds}`;
  }
}

/** The shelf that a place is on; null: a new one, or the bench. */
export const shelfName = (board: BoardFacts, gap: Gap): string | null =>
  gap.key === 'new' || gap.key === 'bench' ? null : nameOf(board.chains, gap.toChainId);

/** The place as the list names it. */
export function placeTitle(board: BoardFacts, gap: Gap): string {
  if (gap.key === 'new') return 'New shelf, fresh pack';
  if (gap.key === 'bench') return 'On the bench';
  if (gap.afterBatchId) return `After ${batchName(board, gap.afterBatchId)}`;
  return `First on ${nameOf(board.chains, gap.toChainId)}`;
}

/** Where a batch stands now, in words. */
export function standing(board: BoardFacts, batchId: string): string {
  const batch = board.batches.find((row) => row.id === batchId);
  if (!batch || batch.chainId === null) return 'on the bench';
  const row = indexed(board).batchesOf(batch.chainId);
  const place = row.findIndex((other) => other.id === batchId) + 1;
  return `on ${nameOf(board.chains, batch.chainId)}, place ${place} of ${row.length}`;
}

/** Where a gap is: shelf and position as they would be after the drop. */
export function placeWords(board: BoardFacts, gap: Gap, batchId: string): string {
  if (gap.key === 'new') return 'a new shelf';
  if (gap.key === 'bench') return 'the bench';
  const row = indexed(board)
    .batchesOf(gap.toChainId)
    .filter((batch) => batch.id !== batchId);
  const place = row.findIndex((batch) => batch.id === gap.afterBatchId) + 2;
  const after = gap.afterBatchId ? `, after ${batchName(board, gap.afterBatchId)}` : '';
  const shelf = nameOf(board.chains, gap.toChainId);
  return `${shelf}, place ${gap.afterBatchId ? place : 1} of ${row.length + 1}${after}`;
}

/** "Mind 2, Fri 17 April: hops in the cake; dark before pale". */
export function judgementWords(gap: Gap): string {
  const day = gap.brewOn ? `, ${formatDay(gap.brewOn)}` : '';
  const reasons = gap.reasons.length > 0 ? `: ${gap.reasons.join('; ')}` : '';
  return `${gapWord(gap)}${day}${reasons}`;
}

/** Why, in the list of places: the findings, else what the place gives. */
export function reasonWords(board: BoardFacts, gap: Gap): string {
  if (gap.reasons.length > 0) return gap.reasons.join('; ');
  if (gap.key === 'bench') return 'Waits there without a cake';
  const shelf = gap.afterBatchId ? nameOf(board.chains, gap.toChainId) : null;
  const generation = gap.generation === null ? null : `generation ${gap.generation}`;
  return [shelf, generation].filter(Boolean).join(', ');
}

/** The date on a gap's tag. */
export const gapDay = (gap: Gap) => (gap.brewOn ? formatDayShort(gap.brewOn) : 'any day');

/** What a locked place says: when its cake was poured, or why it is no place for the batch. */
export function lockWords(board: BoardFacts, gap: Gap): string {
  switch (gap.locked) {
    case 'own-branch':
      return 'comes of its own cake';
    case 'no-yeast':
      return 'no yeast yet';
    case 'poured':
    case null: {
      const row = indexed(board).batchesOf(gap.toChainId);
      const after = row.findIndex((batch) => batch.id === gap.afterBatchId);
      const poured = row.slice(after + 1).find((batch) => batch.stage !== 'pencilled');
      return poured?.brewOn ? `poured ${formatDayShort(poured.brewOn)}` : 'poured';
    }
  }
}

export function liftedWords(board: BoardFacts, batchId: string, best: Gap | undefined): string {
  const lifted = `Lifted ${batchName(board, batchId)}, ${standing(board, batchId)}.`;
  if (!best) return `${lifted} There is no other place for it.`;
  if (best.here) return `${lifted} It is in its best place.`;
  return `${lifted} Best gap: ${placeWords(board, best, batchId)}. ${judgementWords(best)}.`;
}

export function walkedWords(board: BoardFacts, gap: Gap, batchId: string): string {
  const best = gap.best ? 'Best gap. ' : '';
  return `${best}${capital(placeWords(board, gap, batchId))}. ${judgementWords(gap)}.`;
}

export function droppedWords(
  board: BoardFacts,
  batchId: string,
  gap: Gap,
  shifted: number,
): string {
  const dates = shifted > 0 ? ` ${plural(shifted, 'date', 'dates')} shifted.` : '';
  const where = gap.key === 'new' ? 'on a new shelf' : standing(board, batchId);
  const verdict = gap.key === 'bench' ? '' : ` ${judgementWords(gap)}.`;
  return `${batchName(board, batchId)} put down ${where}.${verdict}${dates}`;
}

export const keptDatesWords = (board: BoardFacts, batchId: string) =>
  `${batchName(board, batchId)} is ${standing(board, batchId)}, with every date as it was before.`;

export const putBackWords = (board: BoardFacts, batchId: string) =>
  `${batchName(board, batchId)} put back ${standing(board, batchId)}.`;

export const goneWords = (name: string) =>
  `${name} is no longer on this board. Somebody took it away; there is nothing left to put down.`;

export const movedAwayWords = (board: BoardFacts, batchId: string) =>
  `Somebody moved ${batchName(board, batchId)} in the meantime: it is ${standing(board, batchId)}. Nothing of yours was lost.`;
