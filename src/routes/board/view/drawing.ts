import type { Batch } from '#shared/api/batch.ts';
import type { VesselShape } from '#shared/api/vessel.ts';
import type { BoardIndex } from '#shared/chain/board.ts';
import type { JudgedBoard } from '#shared/chain/judgeBoard.ts';
import type { Day } from '#shared/rules/vocabulary.ts';
import type { VesselProps } from '../../../components/drawn/Vessel.tsx';
import { isFoaming, volumeOf } from './words.ts';

/** Sizes of a shelf, px. The text beside a vessel is the room in which a gap opens. */
export const SHELF = {
  vessel: 78,
  cell: 219,
  gap: 141,
  start: 141,
  top: 128,
  board: 10,
  foot: 82,
} as const;
export const SHELF_HEIGHT = SHELF.top + SHELF.board + SHELF.foot;

const USUAL_FILL = 0.72;
const USUAL_CAKE = 0.03;

export function vesselOf(batch: Batch, index: BoardIndex) {
  const chain = batch.chainId === null ? undefined : index.chain(batch.chainId);
  const id = batch.vesselId ?? chain?.vesselId ?? null;
  return id === null ? undefined : index.vessels.get(id);
}

export const shapeOf = (batch: Batch, index: BoardIndex): VesselShape =>
  vesselOf(batch, index)?.shape ?? 'bucket';

/** The estimate of the cake that this batch leaves, where a link speaks of it. */
function cakeShare(batch: Batch, capacityL: number, index: BoardIndex, judged: JudgedBoard) {
  if (batch.cake?.measured?.volumeL) return batch.cake.measured.volumeL / capacityL;
  if (batch.chainId === null) return USUAL_CAKE;
  const mates = index.batchesOf(batch.chainId);
  const next = mates[mates.indexOf(batch) + 1];
  const volume = next && judged.links.get(next.id)?.cake.volumeL;
  return volume ? volume / capacityL : USUAL_CAKE;
}

const isHopped = (batch: Batch) =>
  batch.dryHops?.some((hop) => hop.timing === 'on-cake' && hop.gramsPerLitre > 0) ?? false;

const SHAPE_WORDS: Record<VesselShape, string> = {
  bucket: 'Bucket',
  carboy: 'Carboy',
  conical: 'Conical',
  keg: 'Keg',
};

/** A batch as its vessel is drawn: plain values only, so that an unchanged one is not drawn again. */
export function drawnVessel(
  batch: Batch,
  index: BoardIndex,
  judged: JudgedBoard,
  today: Day,
): VesselProps {
  const vessel = vesselOf(batch, index);
  const volume = volumeOf(batch);
  const capacity = vessel?.capacityL;
  const fill = capacity && volume !== null ? volume / capacity : USUAL_FILL;
  const cake = capacity ? cakeShare(batch, capacity, index, judged) : USUAL_CAKE;
  const shape = vessel?.shape ?? 'bucket';
  const hops = isHopped(batch);
  return {
    shape,
    srm: batch.srm,
    fill: Math.round(fill * 100) / 100,
    cake: Math.round(cake * 1000) / 1000,
    stage: batch.stage,
    foam: isFoaming(batch, today),
    hops,
    label: [
      vessel?.name ?? SHAPE_WORDS[shape],
      `${Math.min(100, Math.round(fill * 100))} % full`,
      ...(batch.srm === null ? ['colour unknown'] : []),
      ...(hops ? ['hops on the cake'] : []),
    ].join(', '),
  };
}
