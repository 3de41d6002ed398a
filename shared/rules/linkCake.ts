import { estimateCake } from '../cake/estimate.ts';
import { recommendedKeep } from '../cake/keep.ts';
import type { Interval } from './answer.ts';
import type { BatchFacts, PourFacts } from './facts.ts';
import { freeCakeL } from './freeCake.ts';
import type { YeastKind } from './vocabulary.ts';

export interface LinkCake {
  /** Living cells when the wort is poured; undefined where the survival of the wait is unknown. */
  viableCells: Interval | undefined;
  /** The same without any wait: no cake can hold more. */
  freshCells: Interval;
  volumeL: Interval;
  massKg: Interval;
  measured: boolean;
}

/** A's cake after its wait; undefined where A's volume or gravities are unknown. */
export function linkCake(
  a: BatchFacts,
  kind: YeastKind,
  survival: number | undefined,
): LinkCake | undefined {
  const { volumeL, og, fg } = a;
  if (volumeL === undefined || og === undefined || fg === undefined) return undefined;
  const { trub = 'some', measuredCake: measured } = a;
  const fresh = estimateCake({ volumeL, og, fg, kind, trub, survival: 1, measured });
  return {
    viableCells: survival === undefined ? undefined : times(fresh.viableCells, survival),
    freshCells: fresh.viableCells,
    volumeL: fresh.volumeL,
    massKg: fresh.massKg,
    measured: fresh.measured,
  };
}

const times = (x: Interval, by: number): Interval => ({
  low: x.low * by,
  likely: x.likely * by,
  high: x.high * by,
});

export function recommendedFor(
  cake: LinkCake | undefined,
  need: number | undefined,
  pour: Pick<PourFacts, 'sharedWith'> = {},
): { litres: number; kg: number } | undefined {
  if (cake?.viableCells === undefined || need === undefined) return undefined;
  const { viableCells, volumeL, massKg, measured } = cake;
  const wanted = recommendedKeep({ cake: { viableCells, volumeL, massKg, measured }, need });
  const free = freeCakeL(volumeL.likely, pour) ?? 0;
  if (wanted.litres <= free) return wanted;
  return { litres: free, kg: (massKg.likely * free) / volumeL.likely };
}
