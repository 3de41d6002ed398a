import clsx from 'clsx';
import type { ReactNode } from 'react';
import type { Batch } from '#shared/api/batch.ts';
import { apparentAttenuation } from '#shared/fermentation/attenuation.ts';
import { abv } from '#shared/units/alcohol.ts';
import { platoFromSg } from '#shared/units/gravity.ts';
import { format } from '#shared/units/quantity.ts';
import { Swatch } from '../../components/drawn/Swatch.tsx';
import { Card, CardTitle } from '../../components/ui/Card.tsx';
import { useBoardView } from '../board/view/BoardView.tsx';
import { gravityText } from '../board/view/words.ts';

interface Line {
  label: string;
  planned: ReactNode;
  read: ReactNode;
  apart: string;
  /** Far enough from the plan that it is worth a look. */
  isFar?: boolean;
}

/** What was planned beside what was read. */
export function PlannedAndRead({ batch }: { batch: Batch }) {
  const lines = useLines(batch);
  return (
    <Card>
      <CardTitle>Planned and read</CardTitle>
      <table className="mt-1 w-full text-body">
        <thead className="text-right text-small text-ink2">
          <tr>
            <th>
              <span className="sr-only">Figure</span>
            </th>
            <th className="pb-1 font-semibold">Planned</th>
            <th className="pb-1 font-semibold">Read</th>
            <th className="pb-1 font-semibold">Apart by</th>
          </tr>
        </thead>
        <tbody>
          {lines.map(({ label, planned, read, apart, isFar }) => (
            <tr key={label} className="border-t border-line2">
              <th scope="row" className="py-1.5 pr-2 text-left font-normal text-ink2">
                {label}
              </th>
              <td className="py-1.5 text-right whitespace-nowrap">{planned ?? '–'}</td>
              <td className="py-1.5 pl-2 text-right font-bold whitespace-nowrap">{read ?? '–'}</td>
              <td
                className={clsx(
                  'py-1.5 pl-2 text-right whitespace-nowrap',
                  isFar && 'font-bold text-mind',
                )}
              >
                {apart}
              </td>
            </tr>
          ))}
        </tbody>
      </table>
      <p className="mt-2 text-small text-ink2">
        Read figures replace the plan in every verdict. Colour is not read: it is worked out from
        the recipe.
      </p>
    </Card>
  );
}

function useLines(batch: Batch): Line[] {
  const { units } = useBoardView();
  const { og, fg, read, followed } = batch;
  const isSoFar = read.fg === null && followed?.gravity != null && batch.stage !== 'pencilled';
  const readFg = read.fg ?? (isSoFar ? followed.gravity : null);
  const gravity = (sg: number | null) => (sg === null ? null : gravityText(sg, units));
  const pair = (from: number | null, to: number | null, use: (og: number, fg: number) => number) =>
    from === null || to === null ? null : use(from, to);
  const soFar = isSoFar ? ' so far' : '';
  const percent = (share: number | null) => (share === null ? null : `${Math.round(share * 100)} %`);
  const alcohol = (value: number | null) => (value === null ? null : format('alcohol', value, units));
  const [abvPlanned, abvRead] = [pair(og, fg, abv), pair(read.og, readFg, abv)];
  const [attPlanned, attRead] = [
    pair(og, fg, apparentAttenuation),
    pair(read.og, readFg, apparentAttenuation),
  ];
  const volumeGap = gap(batch.volumeL, read.volumeL);
  return [
    {
      label: 'Original gravity',
      planned: gravity(og),
      read: gravity(read.og),
      ...useGravityGap(og, read.og),
    },
    {
      label: `Final gravity${soFar}`,
      planned: gravity(fg),
      read: gravity(readFg),
      ...useGravityGap(fg, readFg, isSoFar),
    },
    {
      label: `Alcohol${soFar}`,
      planned: alcohol(abvPlanned),
      read: alcohol(abvRead),
      apart: signed(gap(abvPlanned, abvRead), 1, ''),
    },
    {
      label: `Apparent attenuation${soFar}`,
      planned: percent(attPlanned),
      read: percent(attRead),
      apart: signed(scaled(gap(attPlanned, attRead), 100), 0, ' %'),
    },
    {
      label: 'Colour',
      planned: batch.srm !== null && (
        <span className="inline-flex items-center gap-2">
          <Swatch srm={batch.srm} />
          {format('colour', batch.srm, units)}
        </span>
      ),
      read: null,
      apart: '',
    },
    {
      label: 'Volume in the vessel',
      planned: batch.volumeL === null ? null : format('volume', batch.volumeL, units),
      read: read.volumeL === null ? null : format('volume', read.volumeL, units),
      apart:
        volumeGap === null ? '' : `${volumeGap < 0 ? '−' : '+'}${format('volume', Math.abs(volumeGap), units)}`,
      isFar: volumeGap !== null && batch.volumeL !== null && Math.abs(volumeGap) > FAR_VOLUME * batch.volumeL,
    },
  ];
}

/** Shares of the plan, or points, from which a difference is set off: no rule, only a look. */
const FAR_VOLUME = 0.05;
const FAR_SG = 0.004;

const gap = (planned: number | null, read: number | null): number | null =>
  planned === null || read === null ? null : read - planned;

const scaled = (value: number | null, by: number) => (value === null ? null : value * by);

function signed(value: number | null, digits: number, unit: string): string {
  if (value === null) return '';
  const rounded = Number(value.toFixed(digits));
  if (rounded === 0) return '0';
  return `${rounded < 0 ? '−' : '+'}${Math.abs(rounded)}${unit}`;
}

/** In points, or °P. A gravity that is still falling is not off. */
function useGravityGap(planned: number | null, read: number | null, isFalling = false) {
  const { units } = useBoardView();
  if (planned === null || read === null) return { apart: '' };
  const isFar = !isFalling && Math.abs(read - planned) > FAR_SG;
  if (units.gravity === 'plato')
    return { apart: signed(platoFromSg(read) - platoFromSg(planned), 1, ' °P'), isFar };
  const points = Math.round((read - planned) * 1000);
  return { apart: signed(points, 0, Math.abs(points) === 1 ? ' point' : ' points'), isFar };
}
