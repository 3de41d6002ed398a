import type { VesselShape } from '#shared/api/vessel.ts';
import type { Moved, MoveRequest } from '#shared/api/move.ts';
import type { Gap } from '#shared/chain/gaps.ts';
import type { Walk } from './places.ts';

/** A batch in the hand, with every place judged as the drop would make it. */
export interface Lifted {
  batchId: string;
  name: string;
  by: 'pointer' | 'keys';
  /** Where it was lifted from; null: the bench. */
  chainId: string | null;
  /** Of the batch's own vessel; null: whichever the shelf has. */
  shape: VesselShape | null;
  gaps: ReadonlyMap<string, Gap>;
  ranked: readonly Gap[];
  /** What each locked place says. */
  locks: ReadonlyMap<string, string>;
  walk: Walk;
}

/** What stands in an open place. */
export interface Face {
  gap: Gap;
  shape: VesselShape | null;
  /** What a locked place says. */
  lock: string;
}

export function faceOf({ gaps, locks, shape }: Lifted, key: string): Face | null {
  const gap = gaps.get(key);
  return gap ? { gap, shape, lock: locks.get(key) ?? '' } : null;
}

/** What the last drop did, for the panel. */
export interface Change {
  request: MoveRequest;
  gap: Gap;
  status: 'saving' | 'saved';
  what: string;
  shifted: Moved['shifted'];
  cleared: Moved['cleared'];
  /** Known once the server has answered. */
  changeId: string | null;
}

export interface LiftState {
  lifted: Lifted | null;
  /** The panel has given way to the places. */
  isUnfolded: boolean;
  /** What is drawn by now in the gaps: they open, and close again, a few in each frame. */
  opened: ReadonlyMap<string, Face>;
  /** The place under the pointer or under the keys. */
  over: string | null;
  /** A batch whose list of places is open. */
  placesFor: string | null;
  /** A drop on a new shelf that waits for its yeast. */
  yeastFor: { batchId: string; gap: Gap; from: string | null } | null;
  change: Change | null;
  /** Why the last move, undo or redo did not happen. */
  refusal: string | null;
}

export const NOTHING_OPEN: ReadonlyMap<string, Face> = new Map();

export const AT_REST: LiftState = {
  lifted: null,
  isUnfolded: false,
  opened: NOTHING_OPEN,
  over: null,
  placesFor: null,
  yeastFor: null,
  change: null,
  refusal: null,
};
