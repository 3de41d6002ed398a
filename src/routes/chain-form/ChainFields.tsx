import { useFormContext } from 'react-hook-form';
import { useBoard } from '../../api/board.ts';
import { useUnits } from '../../app/useUnits.ts';
import { moneyKind } from '../../components/form/plainNumbers.ts';
import { SelectField } from '../../components/form/SelectField.tsx';
import { TextField } from '../../components/form/TextField.tsx';
import { written, type Written } from '../../components/form/written.ts';
import { StartFields } from './StartFields.tsx';

export function ChainFields({ chainId }: { chainId: string }) {
  const { yeasts, vessels } = useBoard();
  const takeYeast = useTakeYeast();
  const choices = yeasts.map(({ id, name }) => ({ value: id, label: name }));
  return (
    <>
      <SelectField
        name="yeastId"
        label="Yeast"
        options={[{ value: '', label: 'Choose a yeast' }, ...choices]}
        onPicked={takeYeast}
      />
      <TextField name="name" label="Name of the shelf" autoComplete="off" />
      <SelectField
        name="vesselId"
        label="Vessel"
        none="None yet"
        options={vessels.map(({ id, name }) => ({ value: id, label: name }))}
        hint="A batch may stand in a vessel of its own."
      />
      <StartFields chainId={chainId} />
    </>
  );
}

/** A chosen yeast gives its name and its price, where nobody has written another. */
function useTakeYeast() {
  const { yeasts, brewery } = useBoard();
  const units = useUnits();
  const { getValues, setValue } = useFormContext();
  const priceOf = (packPrice: number | null) =>
    written(moneyKind(brewery.currency), packPrice, units);
  return (yeastId: string | null) => {
    const yeast = yeasts.find((one) => one.id === yeastId);
    if (!yeast) return;
    const named = String(getValues('name')).trim();
    if (named === '' || yeasts.some((one) => one.name === named)) setValue('name', yeast.name);
    const price = (getValues('start.price') as Written).text;
    if (price === '' || yeasts.some((one) => priceOf(one.packPrice).text === price))
      setValue('start.price', priceOf(yeast.packPrice));
  };
}
