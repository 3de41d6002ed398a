import type { Batch } from '../api/batch.ts';
import type { Chain } from '../api/chain.ts';
import { isPencilled, UNSETTLED_LINK, type BoardIndex } from './board.ts';
import { nextBrewDay, pullAlong } from './dates.ts';
import { draftOver, type Draft } from './draft.ts';

/** Where a batch would go: a chain after one of its batches (null: first), or the bench. */
export interface Target {
  /** Null: the bench. */
  chainId: string | null;
  afterId: string | null;
  /** The chain of `chainId`, where the same move makes it. */
  added: Chain | null;
}

export interface Plan {
  draft: Draft;
  /** Batches that would stand on another cake than now, the moved one first. */
  relinked: string[];
}

/** Why a batch cannot go somewhere. */
export type Lock = 'poured' | 'own-branch' | 'no-yeast';

/** What stands in the way of putting `batch` at the target, if anything. */
export function lockOf(index: BoardIndex, batch: Batch, target: Target): Lock | null {
  if (target.chainId === null) return null;
  const mates = withoutBatch(index.batchesOf(target.chainId), batch.id);
  const place = placeAfter(mates, target.afterId);
  if (place < firstOpenPlace(mates)) return 'poured';
  return descendsFrom(index, target.chainId, batch.id, target.added) ? 'own-branch' : null;
}

/** Nothing is put before a batch that is poured. */
export const firstOpenPlace = (mates: readonly Batch[]): number =>
  mates.findLastIndex((mate) => !isPencilled(mate)) + 1;

/** True where a chain starts from this batch's cake, itself or through the chains it came from. */
export function descendsFrom(
  index: BoardIndex,
  chainId: string,
  batchId: string,
  added: Chain | null,
): boolean {
  const seen = new Set<string>();
  let chain = added?.id === chainId ? added : index.chain(chainId);
  while (chain?.start.kind === 'cake' && !seen.has(chain.id)) {
    if (chain.start.batchId === batchId) return true;
    seen.add(chain.id);
    const above = index.batch(chain.start.batchId)?.chainId;
    chain = above ? index.chain(above) : undefined;
  }
  return false;
}

/**
 * The board as a drop would make it, order and dates together. `ownDay` is the day of a batch that
 * comes first on a shelf without a date. The target must not be locked.
 */
export function planMove(
  index: BoardIndex,
  batch: Batch,
  target: Target,
  dates: 'pull' | 'keep',
  ownDay: () => string | null = () => nextBrewDay(index, batch.id),
): Plan {
  const draft = draftOver(index, target.added);
  const from = takeOut(index, draft, batch);
  const into = putIn(draft, batch, target);
  const candidates = [batch, from?.next, into?.next].flatMap((mate) => (mate ? [mate.id] : []));
  const relinked = [...new Set(candidates)].filter(
    (id) => draft.predecessor(id)?.id !== index.predecessor(id)?.id,
  );
  for (const id of relinked) unsettle(draft, id);
  if (dates === 'pull') {
    if (into) giveOwnDay(draft, batch.id, ownDay);
    const follows = (id: string) => relinked.includes(id);
    if (from) pullAlong(index, draft, from.chainId, placeOf(draft, from.next), follows);
    if (into) pullAlong(index, draft, into.chainId, placeOf(draft, draft.batch(batch.id)), follows);
  }
  return { draft, relinked };
}

/** Takes the batch out of its chain; `next` is the one that stood behind it. */
function takeOut(index: BoardIndex, draft: Draft, batch: Batch) {
  if (batch.chainId === null) return null;
  const mates = index.batchesOf(batch.chainId);
  const next = mates[mates.findIndex((mate) => mate.id === batch.id) + 1];
  draft.setOrder(batch.chainId, withoutBatch(mates, batch.id));
  return next ? { chainId: batch.chainId, next } : null;
}

/** Puts the batch in at the target; `next` is the one that stands behind it then. */
function putIn(draft: Draft, batch: Batch, { chainId, afterId }: Target) {
  const row = { ...batch, chainId };
  if (chainId !== null) {
    const mates = draft.batchesOf(chainId);
    const place = placeAfter(mates, afterId);
    draft.setOrder(chainId, [...mates.slice(0, place), row, ...mates.slice(place)]);
    draft.put(row);
    return { chainId, next: mates[place] };
  }
  draft.put(row);
  return null;
}

function unsettle(draft: Draft, id: string): void {
  const row = draft.batch(id);
  if (row && isSettled(row)) draft.put({ ...row, link: UNSETTLED_LINK });
}

/** True where anything was said of the link from the batch before. */
export const isSettled = ({ link }: Batch): boolean =>
  link.takenOn !== null ||
  link.keepL !== null ||
  link.keepWhole ||
  link.leftAboveL !== null ||
  link.cakeC !== null ||
  link.starter ||
  link.acceptance !== null;

function giveOwnDay(draft: Draft, id: string, ownDay: () => string | null): void {
  const row = draft.batch(id);
  if (row && row.brewOn === null && draft.predecessor(id) === null)
    draft.put({ ...row, brewOn: ownDay() });
}

const placeOf = (draft: Draft, batch: Batch | undefined): number =>
  batch?.chainId ? draft.batchesOf(batch.chainId).findIndex((mate) => mate.id === batch.id) : 0;

export const withoutBatch = (batches: readonly Batch[], id: string): Batch[] =>
  batches.filter((batch) => batch.id !== id);

/** The place behind a batch; first where there is none. −1 never comes of a batch in the list. */
const placeAfter = (batches: readonly Batch[], afterId: string | null): number =>
  afterId === null ? 0 : batches.findIndex((batch) => batch.id === afterId) + 1;
