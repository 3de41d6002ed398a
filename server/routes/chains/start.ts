import type { Chain, ChainStart } from '#shared/api/chain.ts';
import { yeastLine } from '../../db/schema/stock.ts';
import { invalidField } from '../../problems.ts';
import type { BoardNow, Hand } from '../board/hand.ts';

/** What of a chain says where its yeast comes from. */
type Started = Pick<Chain, 'id' | 'yeastId' | 'start'>;

/**
 * The line that a chain belongs to: the one of the cake it starts from, else one of its own, which
 * bears the chain's id.
 */
export async function lineFor({ tx, board, member }: Hand, chain: Started): Promise<string> {
  const source = sourceChain(board, chain.start);
  if (source) return source.lineId;
  const { id, yeastId } = chain;
  await tx
    .insert(yeastLine)
    .values({ id, yeastId, breweryId: member.brewery.id })
    .onConflictDoUpdate({ target: yeastLine.id, set: { yeastId } });
  return id;
}

function sourceChain(board: BoardNow, start: ChainStart): Chain | undefined {
  if (start.kind !== 'cake') return undefined;
  const source = board.batches.find(({ id }) => id === start.batchId);
  return board.chains.find(({ id }) => id === source?.chainId);
}

/** A cake can start a shelf where it is on the board, of the same yeast, and not the shelf's own child. */
export function demandStart(board: BoardNow, chain: Started, at = ''): void {
  if (chain.start.kind !== 'cake') return;
  const source = sourceChain(board, chain.start);
  if (!source) throw invalidField(`${at}/start/batchId`, 'Choose a batch that stands on a shelf');
  if (source.yeastId !== chain.yeastId)
    throw invalidField(`${at}/yeastId`, 'This cake is of another yeast');
  if (comesFrom(board, source, chain.id))
    throw invalidField(`${at}/start/batchId`, 'This cake comes from the same shelf');
}

function comesFrom(board: BoardNow, from: Chain, chainId: string): boolean {
  const seen = new Set<string>();
  let chain: Chain | undefined = from;
  while (chain && !seen.has(chain.id)) {
    if (chain.id === chainId) return true;
    seen.add(chain.id);
    chain = sourceChain(board, chain.start);
  }
  return false;
}
