import { useFormContext, useWatch } from 'react-hook-form';
import { useBoard } from '../../api/board.ts';
import { QuantityField } from '../../components/form/QuantityField.tsx';
import { SegmentedField } from '../../components/form/SegmentedField.tsx';
import { SelectField } from '../../components/form/SelectField.tsx';
import { SlurryFields } from './SlurryFields.tsx';

const STARTS = [
  { value: 'pack', label: 'Fresh pack' },
  { value: 'cake', label: 'Part of a cake' },
  { value: 'outside', label: 'From outside' },
];

/** Where the first batch of the shelf gets its yeast from. */
export function StartFields({ chainId }: { chainId: string }) {
  const { currency } = useBoard().brewery;
  const { control } = useFormContext();
  const kind: unknown = useWatch({ control, name: 'start.kind' });
  const price = (label: string) => (
    <QuantityField
      name="start.price"
      label={label}
      unit={currency}
      hint="Shared by every batch made from it."
    />
  );
  return (
    <>
      <SegmentedField name="start.kind" label="The yeast starts as" options={STARTS} />
      {kind === 'pack' && price('Price of the pack')}
      {kind === 'cake' && <CakeSource chainId={chainId} />}
      {kind === 'outside' && (
        <>
          <div className="grid gap-4 tablet:grid-cols-2">
            <QuantityField
              name="start.generation"
              label="Generation of the first batch"
              hint="A pack makes generation 1; slurry from it makes 2."
            />
            {price('What it cost')}
          </div>
          <SlurryFields />
        </>
      )}
    </>
  );
}

function CakeSource({ chainId }: { chainId: string }) {
  const { batches, chains } = useBoard();
  const { control } = useFormContext();
  const yeastId: unknown = useWatch({ control, name: 'yeastId' });
  const sources = chains
    .filter((chain) => chain.yeastId === yeastId && chain.id !== chainId)
    .flatMap((chain) =>
      batches
        .filter((batch) => batch.chainId === chain.id && batch.stage !== 'scrapped')
        .toSorted((a, b) => a.place - b.place)
        .map((batch) => ({ value: batch.id, label: `${batch.name}, on ${chain.name}` })),
    );
  if (sources.length === 0)
    return (
      <p className="text-small text-ink2">
        No other shelf of this yeast has a batch whose cake could be parted.
      </p>
    );
  return (
    <SelectField
      name="start.batchId"
      label="Whose cake"
      options={[{ value: '', label: 'Choose a batch' }, ...sources]}
      hint="How much of it is taken is set at the link."
    />
  );
}
