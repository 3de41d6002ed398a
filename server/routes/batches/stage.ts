import type { Batch, StageRequest } from '#shared/api/batch.ts';
import { indexBoard, UNSETTLED_LINK, type BoardIndex } from '#shared/chain/board.ts';
import { takersOf } from '#shared/chain/takers.ts';
import { tellStage } from '#shared/record/stages.ts';
import { demandVersion } from '../../http/etag.ts';
import { invalidField, problem } from '../../problems.ts';
import type { Command } from '../board/changeBoard.ts';
import type { Hand } from '../board/hand.ts';
import { one } from '../board/find.ts';
import { sayerOf } from '../board/sayer.ts';
import { demandNoPour } from '../pour/onRecord.ts';
import { dropCake, setCake } from './cakes.ts';
import { demandNoBranch } from './edit.ts';
import { closeUp, endOf, linkColumns, writeBatch } from './rows.ts';

/** A stage set by hand, with what was read, and what it means for the cakes around. */
export const setStage =
  (id: string, version: number, wish: StageRequest): Command =>
  async (hand) => {
    const row = one(hand.board.batches, id);
    demandVersion(version, row.version, row);
    await carryOut(hand, row, wish);
    return { what: tellStage(sayerOf(hand), row.name, wish), touches: [id] };
  };

function carryOut(hand: Hand, row: Batch, wish: StageRequest): Promise<void> {
  switch (wish.stage) {
    case 'pencilled':
      return pencil(hand, row);
    case 'fermenting':
      return brew(hand, row, wish);
    case 'racked':
      return rack(hand, row, wish);
    case 'scrapped':
      return scrap(hand, row, wish.reason);
  }
}

type Brewed = Extract<StageRequest, { stage: 'fermenting' }>;

async function brew(hand: Hand, row: Batch, wish: Brewed): Promise<void> {
  const index = indexBoard(hand.board);
  if (row.chainId === null) throw invalidField('/stage', 'Put it on a shelf first');
  const before = index.predecessor(row.id);
  if (before?.stage === 'pencilled')
    throw invalidField('/stage', `${before.name} comes before it and is not brewed yet`);
  if (row.stage === 'racked') demandNothingPoured(index, row);
  await writeBatch(hand.tx, hand.board, row.id, {
    stage: 'fermenting',
    brewOn: wish.brewedOn,
    readVolumeL: wish.volumeL,
    readOg: wish.og,
    readFg: null,
    rackedOn: null,
  });
  await setCake(hand, row.id, 'growing');
  if (before) await setCake(hand, before.id, 'poured');
}

type Racked = Extract<StageRequest, { stage: 'racked' }>;

async function rack(hand: Hand, row: Batch, wish: Racked): Promise<void> {
  if (row.stage !== 'fermenting' && row.stage !== 'racked')
    throw invalidField('/stage', 'Say first when it was brewed');
  if (row.brewOn !== null && wish.rackedOn < row.brewOn)
    throw invalidField('/rackedOn', 'It was not brewed yet on that day');
  const og = row.read.og ?? row.og;
  if (og !== null && wish.fg !== null && wish.fg > og)
    throw invalidField('/fg', 'The final gravity cannot be above the original');
  await writeBatch(hand.tx, hand.board, row.id, {
    stage: 'racked',
    rackedOn: wish.rackedOn,
    readVolumeL: wish.volumeL ?? row.read.volumeL,
    readFg: wish.fg,
  });
  if (row.cake?.state === 'growing') await setCake(hand, row.id, 'bare');
}

/** Takes a stage back that was set by mistake. */
async function pencil(hand: Hand, row: Batch): Promise<void> {
  const index = indexBoard(hand.board);
  demandNothingPoured(index, row);
  await demandNoPour(hand.tx, [row.id]);
  const before = index.predecessor(row.id);
  await writeBatch(hand.tx, hand.board, row.id, {
    stage: 'pencilled',
    readVolumeL: null,
    readOg: null,
    readFg: null,
    rackedOn: null,
    scrapReason: '',
    ...(row.stage === 'scrapped' && { place: endOf(hand.board, null) }),
  });
  await dropCake(hand, row.id);
  if (before && !othersOnCake(index, before, row))
    await setCake(hand, before.id, before.stage === 'racked' ? 'bare' : 'growing');
}

async function scrap(hand: Hand, row: Batch, reason: string): Promise<void> {
  if (row.stage === 'scrapped') return;
  demandNothingPoured(indexBoard(hand.board), row);
  demandNoBranch(hand.board.chains, row);
  await closeUp(hand, row);
  await writeBatch(hand.tx, hand.board, row.id, {
    stage: 'scrapped',
    chainId: null,
    place: null,
    scrapReason: reason,
    ...linkColumns(UNSETTLED_LINK),
  });
  if (row.cake) await setCake(hand, row.id, 'dumped');
}

const othersOnCake = (index: BoardIndex, before: Batch, except: Batch) =>
  takersOf(index, before).some((each) => each.id !== except.id && each.stage !== 'pencilled');

function demandNothingPoured(index: BoardIndex, row: Batch): void {
  const poured = takersOf(index, row).find(({ stage }) => stage !== 'pencilled');
  if (poured) throw problem('in-use', { detail: `${poured.name} was poured on its cake` });
}
