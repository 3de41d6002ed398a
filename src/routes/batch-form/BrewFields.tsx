import { useFormContext, useWatch } from 'react-hook-form';
import { abv } from '#shared/units/alcohol.ts';
import { format } from '#shared/units/quantity.ts';
import { useBoard } from '../../api/board.ts';
import { useUnits } from '../../app/useUnits.ts';
import { QuantityField } from '../../components/form/QuantityField.tsx';
import { useFollow } from '../../components/form/useFollow.ts';
import type { Written } from '../../components/form/written.ts';
import { ColourField } from './ColourField.tsx';
import { USUAL_ATTENUATION, usualFg, yeastOf } from './usual.ts';

/** The figures that every check needs. */
export function BrewFields({ chainId }: { chainId: string | null }) {
  return (
    <div className="grid grid-cols-2 gap-4">
      <QuantityField name="volumeL" label="Volume" />
      <QuantityField name="ibu" label="Bitterness" />
      <GravityFields chainId={chainId} />
      <ColourField />
    </div>
  );
}

function GravityFields({ chainId }: { chainId: string | null }) {
  const board = useBoard();
  const units = useUnits();
  const { control } = useFormContext();
  const [og, fg, yeastId] = useWatch({ control, name: ['og', 'fg', 'yeastId'] }) as [
    Written,
    Written,
    string | null,
  ];
  const yeast = yeastOf(board, yeastId, chainId);
  const attenuation = yeast?.attenuation ?? USUAL_ATTENUATION;
  const follows = useFollow('fg', usualFg(og.value, attenuation));
  const share = `${Math.round(attenuation * 100)} %`;
  const from =
    yeast && yeast.attenuation !== null
      ? `${share} attenuation of ${yeast.name}`
      : `${share} attenuation (common practice)`;
  return (
    <>
      <QuantityField
        name="og"
        label="Original gravity"
        hint={
          og.value !== null && fg.value !== null && fg.value <= og.value
            ? `${format('alcohol', abv(og.value, fg.value), units)} alcohol`
            : undefined
        }
      />
      <QuantityField
        name="fg"
        label="Final gravity"
        hint={follows ? `Computed from ${from}; write over it.` : undefined}
      />
    </>
  );
}
