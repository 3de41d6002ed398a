import type { Batch } from '../api/batch.ts';
import type { LinkInput } from '../rules/linkInput.ts';
import { unsharedLink, type Sight } from './boardLink.ts';
import { sharedWith } from './shares.ts';

/** What the engine is told of the link into a batch; null where no cake goes under it. */
export function linkInput(laterId: string, sight: Sight): LinkInput | null {
  const later = sight.layout.batch(laterId);
  const earlier = later ? sight.layout.predecessor(laterId) : null;
  return later && earlier ? linkBetween(earlier, later, sight) : null;
}

/** The link of two batches that stand together; null where the yeast is not on the board. */
export function linkBetween(earlier: Batch, later: Batch, sight: Sight): LinkInput | null {
  const input = unsharedLink(earlier, later, sight);
  const others = sharedWith(earlier, later.id, sight);
  if (!input || others.length === 0) return input;
  return { ...input, pour: { ...input.pour, sharedWith: others } };
}
