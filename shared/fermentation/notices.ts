import type { Batch } from '../api/batch.ts';
import type { Yeast } from '../api/yeast.ts';
import { SAY_DEFAULT, type Say } from '../rules/say.ts';
import { expectedFinal } from './attenuation.ts';
import { lagNotice } from './lag.ts';
import type { Notice, Watched } from './seen.ts';
import { stuckNotice } from './stuck.ts';
import { tooLowNotice } from './tooLow.ts';
import { warmthNotice } from './warmth.ts';

/** A batch as its fermentation is watched; null: nothing was read. */
export function watchedOf(
  batch: Pick<Batch, 'followed' | 'read' | 'og' | 'fg' | 'cultures'>,
  yeast: Pick<Yeast, 'kind' | 'attenuation' | 'fermentMinC' | 'fermentMaxC'>,
): Watched | null {
  if (batch.followed === null) return null;
  const og = batch.read.og ?? batch.og ?? batch.followed.firstGravity;
  return {
    followed: batch.followed,
    og,
    expectedFg: expectedFinal(og, batch.fg, yeast.attenuation),
    plannedFg: batch.fg,
    attenuation: yeast.attenuation,
    kind: yeast.kind,
    fermentMinC: yeast.fermentMinC,
    fermentMaxC: yeast.fermentMaxC,
    cultures: batch.cultures ?? [],
  };
}

/** What its readings warn of, the gravest first. */
export function noticesOf(watched: Watched, say: Say = SAY_DEFAULT): Notice[] {
  const stuck = stuckNotice(watched, say);
  const found = [
    stuck,
    tooLowNotice(watched, say),
    // A beer that stands still at its start is said once.
    stuck ? null : lagNotice(watched),
    warmthNotice(watched, say),
  ];
  return found.flatMap((each) => each ?? []);
}
