import { useWatch } from 'react-hook-form';
import type { Board } from '#shared/api/board.ts';
import { CheckField } from '../../../components/form/CheckField.tsx';
import { CheckList } from '../../../components/form/CheckList.tsx';
import { DayField } from '../../../components/form/DayField.tsx';
import { QuantityField } from '../../../components/form/QuantityField.tsx';
import { SegmentedField } from '../../../components/form/SegmentedField.tsx';
import { collect } from '../../../components/form/written.ts';
import { count } from '../../board/view/words.ts';
import { copyPreview, type NewSeason } from './newSeason.ts';

const BREWED = [
  { value: 'pencilled', label: 'Copy them too' },
  { value: 'left-out', label: 'Leave them out' },
];
const DATES = [
  { value: 'start', label: 'Begin on a day' },
  { value: 'shift', label: 'Shift by days' },
];

/** What of a season goes into the new one, and when it is brewed. */
export function CopyFields({ board }: { board: Board }) {
  const values = collect(useWatch()).body as NewSeason;
  const bench = board.batches.filter((row) => row.chainId === null && row.stage === 'pencilled');
  return (
    <>
      {board.chains.length > 0 && (
        <CheckList
          name="chainIds"
          label="Shelves"
          options={board.chains.map(({ id, name }) => ({ value: id, label: name }))}
        />
      )}
      {bench.length > 0 && (
        <CheckField
          name="bench"
          label={`What lies on the bench, ${count(bench.length, 'batch', 'batches')}`}
        />
      )}
      <SegmentedField
        name="brewed"
        label="Batches that were brewed already"
        options={BREWED}
        hint="Copied, they are pencilled like the rest."
      />
      <SegmentedField name="by" label="Dates" options={DATES} />
      {values.by === 'start' ? (
        <DayField name="startOn" label="First brew day" className="max-w-64" />
      ) : (
        <QuantityField
          name="shiftDays"
          label="Days later"
          hint="A minus in front: earlier."
          className="max-w-64"
        />
      )}
      <p aria-live="polite" className="rounded-xl bg-bottle-l px-4 py-3">
        {copyPreview(board, values)}
      </p>
    </>
  );
}
