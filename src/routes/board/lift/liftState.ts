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
  /** Gaps that are drawn by now: they open from the hand outward, a few more in each frame. */
  opened: ReadonlySet<string>;
  /** Parts of the board (a chain, `new`, `bench`) that have given way to their gaps. */
  unfolded: ReadonlySet<string>;
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

export const AT_REST: LiftState = {
  lifted: null,
  isUnfolded: false,
  opened: new Set(),
  unfolded: new Set(),
  over: null,
  placesFor: null,
  yeastFor: null,
  change: null,
  refusal: null,
};

export interface LiftStore {
  get(): LiftState;
  set(part: Partial<LiftState>): void;
  subscribe(listener: () => void): () => void;
}

export function createLiftStore(): LiftStore {
  let state = AT_REST;
  const listeners = new Set<() => void>();
  return {
    get: () => state,
    set(part) {
      state = { ...state, ...part };
      for (const listener of listeners) listener();
    },
    subscribe(listener) {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
  };
}
