import type { Acceptance, Batch } from '#shared/api/batch.ts';
import type { Chain } from '#shared/api/chain.ts';
import type { SharedChain } from '#shared/api/share.ts';
import type { BoardFacts } from '#shared/chain/board.ts';
import { chainAlone, type ChainAlone } from '#shared/chain/chainAlone.ts';
import { judgeBoard } from '#shared/chain/judgeBoard.ts';
import { notFound } from '../../problems.ts';
import { dayIn } from '../../today.ts';
import type { FoundLink } from './find.ts';

/** The chain behind a link, as somebody sees it who knows nothing else of the brewery. */
export function presentShared(board: BoardFacts, { link, brewery }: FoundLink): SharedChain {
  const alone = chainAlone(board, link.chainId);
  if (!alone) throw notFound();
  const { carries } = alone;
  const dayOf = (at: Date) => dayIn(brewery.timeZone, at);
  return {
    breweryName: brewery.name,
    currency: brewery.currency,
    units: brewery.units,
    today: board.today,
    sharedOn: dayOf(link.createdAt),
    until: dayOf(new Date(link.expiresAt.getTime() - 1)),
    houseRules: board.houseRules,
    ...anonymous(alone, brewery.name, link.showPrices),
    startsFromCake: alone.startsFromCake,
    carries: {
      allergens: [...carries.allergens],
      allergensUnknown: carries.allergensUnknown ?? false,
      cultures: [...carries.cultures],
      culturesUnknown: carries.culturesUnknown ?? false,
    },
    costPerBatch: link.showPrices ? costOf(board, link.chainId) : null,
  };
}

const costOf = (board: BoardFacts, chainId: string): number | null =>
  judgeBoard(board).chains.get(chainId)?.costPerBatch ?? null;

/** Ids that mean nothing anywhere else, the same for the same row within one answer. */
function renumbering() {
  const numbers = new Map<string, string>();
  return (id: string): string => {
    const known = numbers.get(id);
    if (known) return known;
    const number = (numbers.size + 1).toString(16).padStart(12, '0');
    const made = `00000000-0000-4000-8000-${number}`;
    numbers.set(id, made);
    return made;
  };
}

type Renumber = ReturnType<typeof renumbering>;

function anonymous(alone: ChainAlone, breweryName: string, showPrices: boolean) {
  const renumber = renumbering();
  const bare = { version: 1, notes: '', typed: {} };
  return {
    chain: anonymousChain(alone.chain, renumber, showPrices),
    yeasts: alone.yeasts.map((yeast) => ({
      ...yeast,
      ...bare,
      id: renumber(yeast.id),
      packPrice: showPrices ? yeast.packPrice : null,
    })),
    vessels: alone.vessels.map((vessel) => ({ ...vessel, ...bare, id: renumber(vessel.id) })),
    batches: alone.batches.map((batch) => ({
      ...anonymousBatch(batch, renumber, breweryName),
      ...bare,
    })),
  };
}

function anonymousChain(chain: Chain, renumber: Renumber, showPrices: boolean): Chain {
  const { start } = chain;
  return {
    ...chain,
    id: renumber(chain.id),
    version: 1,
    yeastId: renumber(chain.yeastId),
    vesselId: chain.vesselId && renumber(chain.vesselId),
    lineId: renumber(chain.lineId),
    position: 0,
    start: 'price' in start && !showPrices ? { ...start, price: null } : start,
  };
}

function anonymousBatch(batch: Batch, renumber: Renumber, breweryName: string): Batch {
  const { link } = batch;
  return {
    ...batch,
    id: renumber(batch.id),
    chainId: batch.chainId && renumber(batch.chainId),
    vesselId: batch.vesselId && renumber(batch.vesselId),
    yeastId: batch.yeastId && renumber(batch.yeastId),
    wantedOn: null,
    link: { ...link, typed: {}, acceptance: ofBrewery(link.acceptance, breweryName) },
  };
}

/** That a hold was accepted is told, not by whom nor in which words. */
export const ofBrewery = (acceptance: Acceptance | null, by: string): Acceptance | null =>
  acceptance && { ...acceptance, reason: '', by };
