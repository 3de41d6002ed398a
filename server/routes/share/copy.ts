import { randomUUID } from 'node:crypto';
import type { Batch } from '#shared/api/batch.ts';
import type { Chain, ChainStart } from '#shared/api/chain.ts';
import type { CopyRequest } from '#shared/api/share.ts';
import { chainAlone, type ChainAlone } from '#shared/chain/chainAlone.ts';
import { UNSETTLED_LINK } from '#shared/chain/board.ts';
import type { Member } from '../../auth/whoAsks.ts';
import { batch } from '../../db/schema/chain.ts';
import { yeast } from '../../db/schema/stock.ts';
import type { Deps } from '../../deps.ts';
import { notFound } from '../../problems.ts';
import { dayIn } from '../../today.ts';
import { linkColumns } from '../batches/rows.ts';
import { changeShared, type Command } from '../board/changeBoard.ts';
import type { Hand } from '../board/hand.ts';
import { one } from '../board/find.ts';
import { loadBoardRows } from '../board/load.ts';
import { insertChain } from '../chains/commands.ts';
import { findShareLink } from './find.ts';

/** The chain behind a link as a plan of one's own: its yeast, its shelf, its batches pencilled. */
export async function copyChain(
  deps: Pick<Deps, 'db' | 'clock'>,
  member: Member,
  { id, token }: CopyRequest,
): Promise<Chain> {
  const copy: Command = async (hand) => {
    if (hand.board.chains.some((each) => each.id === id)) return null;
    const { alone, breweryName } = await readShared(hand, token);
    const yeastId = await ownYeast(hand, alone);
    const { name } = alone.chain;
    const start = startOfCopy(alone.chain.start);
    const made = { id, name, yeastId, vesselId: null, start };
    // The board in hand does not know the yeast yet.
    const yeasts = [...hand.board.yeasts, ...alone.yeasts.map((row) => ({ ...row, id: yeastId }))];
    await insertChain({ ...hand, board: { ...hand.board, yeasts } }, made);
    const batchIds = await insertBatches(hand, alone.batches, id);
    return {
      what: `Copied ${name} from ${breweryName}`,
      before: null,
      after: made,
      touches: [id, ...batchIds],
    };
  };
  const board = await changeShared(deps, member, copy, 'all');
  return one(board.chains, id);
}

async function readShared({ tx, now }: Hand, token: string) {
  const { link, brewery, seasonId } = await findShareLink(tx, token, now);
  const rows = await loadBoardRows(tx, brewery.id, seasonId);
  const today = dayIn(brewery.timeZone, now);
  const alone = rows && chainAlone({ ...rows, today }, link.chainId);
  if (!alone) throw notFound();
  return { alone, breweryName: brewery.name };
}

/** The brewery's own yeast of that name, else a new one with the same facts. */
async function ownYeast({ tx, board, member }: Hand, alone: ChainAlone): Promise<string> {
  const theirs = one(alone.yeasts, alone.chain.yeastId);
  const own = board.yeasts.find(({ name }) => name.toLowerCase() === theirs.name.toLowerCase());
  if (own) return own.id;
  const { version: _, notes: __, ...facts } = theirs;
  const id = randomUUID();
  await tx.insert(yeast).values({ ...facts, id, breweryId: member.brewery.id, packPrice: null });
  return id;
}

/** A fresh pack stays one to buy; anything else arrives as slurry, with what it brings along. */
function startOfCopy(start: ChainStart): ChainStart {
  switch (start.kind) {
    case 'pack':
    case 'outside':
      return { ...start, price: null };
    case 'cake':
      return { kind: 'outside', generation: 1, price: null, allergens: null, cultures: null };
  }
}

async function insertBatches(
  { tx, member, now }: Hand,
  batches: readonly Batch[],
  chainId: string,
): Promise<string[]> {
  const rows = batches.map((each, place) => ({
    ...planOf(each),
    id: randomUUID(),
    chainId,
    place,
    breweryId: member.brewery.id,
    seasonId: member.seasonId,
    createdAt: now,
  }));
  if (rows.length > 0) await tx.insert(batch).values(rows);
  return rows.map(({ id }) => id);
}

/** What was planned of a beer, with what was read where no plan was; its day stays. */
function planOf({ read, link, ...row }: Batch) {
  return {
    ...linkColumns({ ...UNSETTLED_LINK, ...settledOf(link) }),
    name: row.name,
    style: row.style,
    volumeL: row.volumeL ?? read.volumeL,
    og: row.og ?? read.og,
    fg: row.fg ?? read.fg,
    srm: row.srm,
    ibu: row.ibu,
    fermentC: row.fermentC,
    daysUnderBeer: row.daysUnderBeer,
    brewOn: row.brewOn,
    dryHops: row.dryHops,
    additions: row.additions,
    allergens: row.allergens,
    cultures: row.cultures,
    trub: row.trub,
  };
}

/** How the cake goes under it is part of the plan; that somebody accepted a hold is not. */
function settledOf(link: Batch['link']) {
  const { takenOn, keepL, keepWhole, leftAboveL, cakeC, starter } = link;
  return { takenOn, keepL, keepWhole, leftAboveL, cakeC, starter };
}
