import { useWatch } from 'react-hook-form';
import {
  cellsPerMl,
  countError,
  MEBAK_DEAD,
  viability,
  viabilityInterval,
} from '#shared/yeast/counting.ts';
import { QuantityField } from '../../../components/form/QuantityField.tsx';
import type { Written } from '../../../components/form/written.ts';

/** A count in an improved Neubauer chamber, with what it comes to and how far to trust it. */
export function CountFields() {
  return (
    <div className="space-y-3 rounded-xl border-[1.5px] border-line bg-white px-3.5 py-3">
      <div className="grid grid-cols-2 items-end gap-3">
        <QuantityField name="count.living" label="Living cells" />
        <QuantityField name="count.dead" label="Dead (stained) cells" />
        <QuantityField name="count.squares" label="Squares of 25" />
        <QuantityField name="count.dilution" label="Thinned, times" />
      </div>
      <Counted />
      <p className="text-small text-ink2">
        Improved Neubauer chamber, 25 squares of 0.2 mm (ASBC Yeast-4). Count 75 cells or more, some
        400 for the living share (ASBC Yeast-3). Methylene blue overstates it below about 90 %.
      </p>
    </div>
  );
}

interface Values {
  count: Record<'living' | 'dead' | 'squares' | 'dilution', Written>;
}

function Counted() {
  const { count } = useWatch() as Values;
  const [living, dead] = [count.living.value, count.dead.value];
  const [squares, dilution] = [count.squares.value, count.dilution.value];
  if (living === null || dead === null || living < 0 || dead < 0 || living + dead === 0)
    return null;
  const cells =
    squares !== null && squares > 0 && dilution !== null && dilution > 0
      ? cellsPerMl(living + dead, squares, dilution)
      : null;
  const { low, high } = viabilityInterval(living, dead);
  const isExcluded = 1 - viability(living, dead) >= MEBAK_DEAD.exclude;
  return (
    <p role="status" className="text-body">
      <b>{percent(viability(living, dead))} % alive</b> ({percent(low)}–{percent(high)} % by chance
      alone, 95 %)
      {cells !== null && (
        <>
          , <b>{billions(cells)} billion cells/mL</b> ± {percent(1.96 * countError(living + dead))}{' '}
          %
        </>
      )}
      .{isExcluded && ' Large breweries use none with 5 % dead or more (MEBAK M-350.18.518).'}
    </p>
  );
}

const percent = (share: number): string => String(Math.round(share * 1000) / 10);
const billions = (cells: number): string => (cells / 1e9).toPrecision(2);
