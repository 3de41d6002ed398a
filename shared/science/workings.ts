import { TRUB_SHARE } from '../cake/estimate.ts';
import { mixedTemperature } from '../pour/mixing.ts';
import { neverAbove, pourWindow, type PourWindow } from '../pour/window.ts';
import { LinkState } from '../rules/linkState.ts';
import type { LinkInput } from '../rules/linkInput.ts';
import { alcoholByWeight, abv, realExtract } from '../units/alcohol.ts';
import { beerLab, GLASS_CM, type Lab } from '../units/colour.ts';
import { apparentExtract, platoFromSg } from '../units/gravity.ts';
import { growthPerMl, yieldShare } from '../yeast/growth.ts';
import { CELLS_PER_ML_PLATO, pitchNeed } from '../yeast/pitching.ts';
import { lossRate, survivalRange } from '../yeast/storage.ts';

/**
 * The figures that stand between a link's facts and its verdict, step by step. Each comes from the
 * function that the verdict is made with, so that what is explained is what was judged. Undefined:
 * not known. Units: SG, °P, litres, SRM, °C, days, cells.
 */
export interface Workings {
  link: LinkState;
  alcohol: { oe: number; ae: number; re: number; byWeight: number; abv: number } | undefined;
  growth:
    | {
        plato: number;
        drop: number;
        share: number;
        perMl: number;
        pitched: number;
        grown: number;
        trub: number;
      }
    | undefined;
  wait: { rate: number; range: { low: number; high: number } } | undefined;
  need: { plato: number; perMlPlato: number } | undefined;
  colours: { planned: Lab; poured: Lab } | undefined;
  window: PourWindow;
  kills: { c: number; own: boolean };
  /** As if the wort were read in the middle of its window. */
  mixing: { wortC: number; cakeC: number; mixedC: number } | undefined;
}

export function workingsOf(input: LinkInput): Workings {
  const link = new LinkState(input);
  return {
    link,
    alcohol: alcoholOf(link),
    growth: growthOf(link),
    wait: waitOf(link),
    need: needOf(link),
    colours: coloursOf(link),
    window: pourWindow(input.yeast),
    kills: neverAbove(input.yeast),
    mixing: mixingOf(link, pourWindow(input.yeast)),
  };
}

function alcoholOf({ a: { og, fg } }: LinkState): Workings['alcohol'] {
  if (og === undefined || fg === undefined) return undefined;
  const [oe, ae] = [platoFromSg(og), apparentExtract(fg)];
  return {
    oe,
    ae,
    re: realExtract(oe, ae),
    byWeight: alcoholByWeight(oe, ae),
    abv: abv(og, fg),
  };
}

function growthOf({ a, yeast: { kind } }: LinkState): Workings['growth'] {
  const { volumeL, og, fg, trub = 'some' } = a;
  if (volumeL === undefined || og === undefined || fg === undefined) return undefined;
  const plato = platoFromSg(og);
  const perMl = growthPerMl(og, fg);
  return {
    plato,
    drop: Math.max(0, plato - apparentExtract(fg)),
    share: yieldShare(plato),
    perMl,
    pitched: pitchNeed({ volumeL, og, kind }),
    grown: perMl * volumeL * 1000,
    trub: TRUB_SHARE[trub],
  };
}

function waitOf({ times: { waitDays, waitC } }: LinkState): Workings['wait'] {
  if (waitDays === undefined || waitDays <= 0 || waitC === undefined) return undefined;
  return { rate: lossRate(waitC), range: survivalRange(waitDays, waitC) };
}

/** Need for each mL and °P, the addition for a strong wort in it. */
function needOf({ b: { volumeL, og }, yeast: { kind }, need }: LinkState): Workings['need'] {
  if (volumeL === undefined || og === undefined || need === undefined) return undefined;
  const plato = platoFromSg(og);
  const perMlPlato = plato > 0 ? need / (plato * volumeL * 1000) : CELLS_PER_ML_PLATO[kind];
  return { plato, perMlPlato };
}

function coloursOf({ b, blend }: LinkState): Workings['colours'] {
  if (b.srm === undefined || blend.srm === undefined) return undefined;
  return { planned: beerLab(b.srm, GLASS_CM), poured: beerLab(blend.srm, GLASS_CM) };
}

function mixingOf({ a, b, kept, pour }: LinkState, window: PourWindow): Workings['mixing'] {
  const { volumeL, og } = b;
  const cakeC = pour.cakeC ?? a.fermentC;
  if (volumeL === undefined || og === undefined || kept.keptL === undefined || cakeC === undefined)
    return undefined;
  const wortC = (window.minC + window.maxC) / 2;
  return {
    wortC,
    cakeC,
    mixedC: mixedTemperature({ volumeL, og }, wortC, { volumeL: kept.keptL, c: cakeC }),
  };
}
