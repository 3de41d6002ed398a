import { useFormContext, useWatch } from 'react-hook-form';
import { Swatch } from '../../components/drawn/Swatch.tsx';
import { QuantityField } from '../../components/form/QuantityField.tsx';
import type { Written } from '../../components/form/written.ts';

/** Colour, with the beer it would be. */
export function ColourField() {
  const { control } = useFormContext();
  const srm = useWatch({ control, name: 'srm' }) as Written;
  return (
    <div className="col-span-2 flex items-start gap-4">
      <QuantityField name="srm" label="Colour" className="grow" />
      <div className="shrink-0 pt-[26px]">
        <Swatch srm={srm.value !== null && srm.value >= 0 ? srm.value : null} size="large" />
      </div>
    </div>
  );
}
