import { useId } from 'react';
import { useFormContext, useWatch } from 'react-hook-form';
import { STYLES, styleNamed, type BeerStyle } from '#shared/styles/styles.ts';
import type { UnitPrefs } from '#shared/api/units.ts';
import { formatBare, unitOf, type QuantityKind } from '#shared/units/quantity.ts';
import { useUnits } from '../../app/useUnits.ts';
import { TextField } from '../../components/form/TextField.tsx';

/** A style of the list, whose usual ranges are then shown, or the brewer's own words. */
export function StyleField() {
  const listId = useId();
  const units = useUnits();
  const { control } = useFormContext();
  const style = styleNamed(String(useWatch({ control, name: 'style' }) ?? ''));
  return (
    <>
      <TextField
        name="style"
        label="Style"
        list={listId}
        autoComplete="off"
        placeholder="Choose one, or your own words"
        hint={style ? styleHint(style, units) : undefined}
      />
      <datalist id={listId}>
        {STYLES.map(({ name }) => (
          <option key={name} value={name} />
        ))}
      </datalist>
    </>
  );
}

function styleHint(style: BeerStyle, units: UnitPrefs): string {
  const range = (kind: QuantityKind, [low, high]: readonly [number, number]) => {
    const unit = unitOf(kind, units);
    // An SG stands alone, as the trade writes it.
    const after = unit === 'SG' ? '' : ` ${unit}`;
    return `${formatBare(kind, low, units)}–${formatBare(kind, high, units)}${after}`;
  };
  return `Usual: OG ${range('gravity', style.og)}, FG ${range('gravity', style.fg)}, ${range('colour', style.srm)}, ${range('bitterness', style.ibu)}, ${range('alcohol', style.abv)} ABV (common practice, from memory).`;
}
