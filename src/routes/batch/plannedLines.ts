import type { Batch } from '#shared/api/batch.ts';
import type { UnitPrefs } from '#shared/api/units.ts';
import { apparentAttenuation } from '#shared/fermentation/attenuation.ts';
import { abv } from '#shared/units/alcohol.ts';
import { platoFromSg } from '#shared/units/gravity.ts';
import { format } from '#shared/units/quantity.ts';
import { gravityText } from '../board/view/words.ts';

export interface Line {
  label: string;
  /** Null: not known. */
  planned: string | null;
  read: string | null;
  apart: string;
  /** Far enough from the plan that it is worth a look. */
  isFar?: boolean;
  /** Of the colour's line. */
  srm?: number | null;
}

/** Shares of the plan, or SG, from which a difference is set off: no rule, only a look. */
const FAR_VOLUME = 0.05;
const FAR_SG = 0.004;

/** What was planned beside what was read; a gravity that still falls is "so far". */
export function plannedLines(batch: Batch, units: UnitPrefs): Line[] {
  const { og, fg, read, followed } = batch;
  const newest = batch.stage === 'pencilled' ? null : (followed?.gravity ?? null);
  const isSoFar = read.fg === null && newest !== null;
  const readFg = read.fg ?? newest;
  const soFar = isSoFar ? ' so far' : '';
  return [
    gravityLine('Original gravity', og, read.og, units, false),
    gravityLine(`Final gravity${soFar}`, fg, readFg, units, isSoFar),
    alcoholLine(`Alcohol${soFar}`, pair(og, fg, abv), pair(read.og, readFg, abv), units),
    attenuationLine(
      `Apparent attenuation${soFar}`,
      pair(og, fg, apparentAttenuation),
      pair(read.og, readFg, apparentAttenuation),
    ),
    {
      label: 'Colour',
      planned: batch.srm === null ? null : format('colour', batch.srm, units),
      read: null,
      apart: '',
      srm: batch.srm,
    },
    volumeLine(batch.volumeL, read.volumeL, units),
  ];
}

const pair = (
  from: number | null,
  to: number | null,
  work: (og: number, fg: number) => number,
): number | null => (from === null || to === null ? null : work(from, to));

const gap = (planned: number | null, read: number | null): number | null =>
  planned === null || read === null ? null : read - planned;

function gravityLine(
  label: string,
  planned: number | null,
  read: number | null,
  units: UnitPrefs,
  isFalling: boolean,
): Line {
  const text = (sg: number | null) => (sg === null ? null : gravityText(sg, units));
  const apart = gap(planned, read);
  return {
    label,
    planned: text(planned),
    read: text(read),
    apart: planned === null || read === null ? '' : gravityGap(planned, read, units),
    isFar: !isFalling && apart !== null && Math.abs(apart) > FAR_SG,
  };
}

/** In points, or °P. */
function gravityGap(planned: number, read: number, units: UnitPrefs): string {
  if (units.gravity === 'plato') return signed(platoFromSg(read) - platoFromSg(planned), 1, ' °P');
  const points = Math.round((read - planned) * 1000);
  return signed(points, 0, Math.abs(points) === 1 ? ' point' : ' points');
}

function alcoholLine(
  label: string,
  planned: number | null,
  read: number | null,
  units: UnitPrefs,
): Line {
  const text = (value: number | null) => (value === null ? null : format('alcohol', value, units));
  return {
    label,
    planned: text(planned),
    read: text(read),
    apart: signed(gap(planned, read), 1, ''),
  };
}

function attenuationLine(label: string, planned: number | null, read: number | null): Line {
  const percent = (share: number | null) => (share === null ? null : Math.round(share * 100));
  const text = (value: number | null) => (value === null ? null : `${value} %`);
  const [from, to] = [percent(planned), percent(read)];
  return { label, planned: text(from), read: text(to), apart: signed(gap(from, to), 0, '') };
}

function volumeLine(planned: number | null, read: number | null, units: UnitPrefs): Line {
  const text = (litres: number | null) =>
    litres === null ? null : format('volume', litres, units);
  const apart = gap(planned, read);
  const sign = (apart ?? 0) < 0 ? '−' : '+';
  return {
    label: 'Volume in the vessel',
    planned: text(planned),
    read: text(read),
    apart:
      apart === null
        ? ''
        : apart === 0
          ? '0'
          : `${sign}${format('volume', Math.abs(apart), units)}`,
    isFar: apart !== null && planned !== null && Math.abs(apart) > FAR_VOLUME * planned,
  };
}

function signed(value: number | null, digits: number, unit: string): string {
  if (value === null) return '';
  const rounded = Number(value.toFixed(digits));
  if (rounded === 0) return '0';
  return `${rounded < 0 ? '−' : '+'}${Math.abs(rounded)}${unit}`;
}
