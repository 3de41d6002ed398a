import { useFieldArray, useFormContext } from 'react-hook-form';
import { ADDITION_WORDS, optionsOf, TIMING_WORDS } from '../../app/traitWords.ts';
import { SelectField } from '../../components/form/SelectField.tsx';
import { AddRow, RemoveRow } from './DryHopFields.tsx';
import { ListHead, useKnown } from './ListHead.tsx';

export function AdditionFields() {
  const { fields, append, remove } = useFieldArray({ name: 'additions' });
  const some = useKnown('additionsKnown');
  const tickMilk = useTickMilk();
  const add = () => append({ what: 'fruit', timing: 'on-cake' });
  return (
    <div className="space-y-3">
      <ListHead
        name="additionsKnown"
        label="Additions"
        onSome={() => fields.length === 0 && add()}
      />
      {some &&
        fields.map((field, index) => (
          <div key={field.id} className="grid grid-cols-[1fr_1fr_auto] gap-3">
            <SelectField
              name={`additions.${index}.what`}
              label="What"
              options={optionsOf(ADDITION_WORDS)}
              onPicked={tickMilk}
            />
            <SelectField
              name={`additions.${index}.timing`}
              label="When it goes in"
              options={optionsOf(TIMING_WORDS)}
            />
            <RemoveRow what="this addition" onRemove={() => remove(index)} />
          </div>
        ))}
      {some && <AddRow onAdd={add}>Add another</AddRow>}
    </div>
  );
}

/** Lactose is made from milk; the box can be unticked again. */
function useTickMilk() {
  const { getValues, setValue } = useFormContext();
  return (what: string | null) => {
    const allergens = getValues('allergens') as string[] | null;
    if (what !== 'lactose' || allergens?.includes('milk')) return;
    setValue('allergens', [...(allergens ?? []), 'milk'], { shouldDirty: true });
  };
}
