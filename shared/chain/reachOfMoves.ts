import type { Batch } from '../api/batch.ts';
import type { ChainStart } from '../api/chain.ts';
import type { BoardIndex } from './board.ts';
import { vesselIdOf } from './vesselUse.ts';

/**
 * The chains where a move must begin or end to change a link that `isBad`: those with such a link,
 * those that share a vessel with them, those that may take of a cake under such a link, and those
 * that any of these come from.
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
  const beside = bad.flatMap(({ id }) => besideBad(index, id, isBad));
  const chains = new Set<string>();
  for (const { id } of [...bad, ...sharing, ...beside]) addWithSources(index, id, chains);
  return chains;
}

/** The chains that start from the cakes under a chain's bad links. */
const besideBad = (index: BoardIndex, chainId: string, isBad: (laterId: string) => boolean) =>
  index
    .batchesOf(chainId)
    .filter(({ id }) => isBad(id))
    .flatMap(({ id }) => index.branchesOf(index.predecessor(id)?.id ?? ''));

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
