import { Plus, X } from 'lucide-react';
import { useFieldArray } from 'react-hook-form';
import { HOP_WORDS, optionsOf, TIMING_WORDS } from '../../app/traitWords.ts';
import { useUnits } from '../../app/useUnits.ts';
import { QuantityField } from '../../components/form/QuantityField.tsx';
import { SelectField } from '../../components/form/SelectField.tsx';
import { written } from '../../components/form/written.ts';
import { Button } from '../../components/ui/Button.tsx';
import { ListHead, useKnown } from './ListHead.tsx';

export function DryHopFields() {
  const units = useUnits();
  const { fields, append, remove } = useFieldArray({ name: 'dryHops' });
  const some = useKnown('dryHopsKnown');
  const add = () =>
    append({
      gramsPerLitre: written('hopRate', null, units),
      contained: 'loose',
      timing: 'on-cake',
    });
  return (
    <div className="space-y-3">
      <ListHead name="dryHopsKnown" label="Dry hops" onSome={() => fields.length === 0 && add()} />
      {some &&
        fields.map((field, index) => (
          <div key={field.id} className="grid grid-cols-[1fr_1fr_auto] gap-3">
            <QuantityField name={`dryHops.${index}.gramsPerLitre`} label="Amount" />
            <SelectField
              name={`dryHops.${index}.contained`}
              label="How"
              options={optionsOf(HOP_WORDS)}
            />
            <RemoveRow what="these hops" onRemove={() => remove(index)} />
            <SelectField
              name={`dryHops.${index}.timing`}
              label="When they go in"
              options={optionsOf(TIMING_WORDS)}
              className="col-span-2"
            />
          </div>
        ))}
      {some && <AddRow onAdd={add}>Add hops</AddRow>}
    </div>
  );
}

export function AddRow({ onAdd, children }: { onAdd: () => void; children: string }) {
  return (
    <Button size="small" look="quiet" onClick={onAdd}>
      <Plus size={16} aria-hidden="true" />
      {children}
    </Button>
  );
}

export function RemoveRow({ what, onRemove }: { what: string; onRemove: () => void }) {
  return (
    <Button
      size="small"
      look="quiet"
      aria-label={`Take out ${what}`}
      onClick={onRemove}
      className="mt-[26px] size-11 px-0"
    >
      <X size={18} aria-hidden="true" />
    </Button>
  );
}
