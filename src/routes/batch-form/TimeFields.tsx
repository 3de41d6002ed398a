import { useFormContext, useWatch } from 'react-hook-form';
import { addDays, formatDay } from '#shared/units/day.ts';
import { useBoard } from '../../api/board.ts';
import { DayField } from '../../components/form/DayField.tsx';
import { QuantityField } from '../../components/form/QuantityField.tsx';
import { useFollow } from '../../components/form/useFollow.ts';
import type { Written } from '../../components/form/written.ts';
import { usualCelsius, usualDays, yeastOf } from './usual.ts';

/** When and how warm. */
export function TimeFields({ chainId, isNew }: { chainId: string | null; isNew: boolean }) {
  const board = useBoard();
  const { control } = useFormContext();
  const [brewOn, days, yeastId] = useWatch({
    control,
    name: ['brewOn', 'daysUnderBeer', 'yeastId'],
  }) as [string | null, Written, string | null];
  const yeast = yeastOf(board, yeastId, chainId);
  // A plan starts from what is usual; an old batch whose field was left empty stays as it is.
  useFollow('fermentC', isNew ? usualCelsius(yeast) : null);
  useFollow('daysUnderBeer', isNew ? usualDays(yeast) : null);
  const racked =
    brewOn && days.value !== null && days.value < 1000
      ? `Racked on ${formatDay(addDays(brewOn, days.value))}.`
      : 'From brew day to racking.';
  return (
    <div className="grid grid-cols-2 gap-4">
      <DayField name="brewOn" label="Brew day" />
      <QuantityField name="daysUnderBeer" label="Days under beer" hint={racked} />
      <QuantityField name="fermentC" label="Ferments at" hint="In the first three days." />
      <DayField name="wantedOn" label="Wanted on" />
    </div>
  );
}
