import type { Batch } from '../api/batch.ts';
import type { ChainStart } from '../api/chain.ts';
import type { BoardIndex } from './board.ts';
import { vesselIdOf } from './vesselUse.ts';

/**
 * The chains where a move must begin or end to change a link that `isBad`: those with such a link,
 * those that share a vessel with them, and those that any of these come from.
 */
export function chainsThatCanHelp(
  index: BoardIndex,
  isBad: (laterId: string) => boolean,
): ReadonlySet<string> {
  const bad = index.chains.filter(({ id }) => index.batchesOf(id).some((batch) => isBad(batch.id)));
  const vessels = new Set(bad.flatMap(({ id }) => vesselsOf(index, index.batchesOf(id))));
  const sharing = index.chains.filter(({ id }) =>
    vesselsOf(index, index.batchesOf(id)).some((vessel) => vessels.has(vessel)),
  );
  const chains = new Set<string>();
  for (const { id } of [...bad, ...sharing]) addWithSources(index, id, chains);
  return chains;
}

const vesselsOf = (index: BoardIndex, batches: readonly Batch[]): string[] =>
  batches.flatMap((batch) => vesselIdOf(batch, index) ?? []);

function addWithSources(index: BoardIndex, chainId: string, chains: Set<string>): void {
  let at: string | null | undefined = chainId;
  while (at && !chains.has(at)) {
    chains.add(at);
    const start: ChainStart | undefined = index.chain(at)?.start;
    at = start?.kind === 'cake' ? index.batch(start.batchId)?.chainId : null;
  }
}
