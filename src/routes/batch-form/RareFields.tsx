import { useFormContext, useWatch } from 'react-hook-form';
import { useBoard } from '../../api/board.ts';
import { ALLERGEN_WORDS, CULTURE_WORDS, optionsOf, TRUB_WORDS } from '../../app/traitWords.ts';
import { CheckList } from '../../components/form/CheckList.tsx';
import { FoldedFields } from '../../components/form/FoldedFields.tsx';
import { NoteField } from '../../components/form/NoteField.tsx';
import { SegmentedField } from '../../components/form/SegmentedField.tsx';
import { SelectField } from '../../components/form/SelectField.tsx';
import { AdditionFields } from './AdditionFields.tsx';
import type { BatchValues } from './batchValues.ts';
import { DryHopFields } from './DryHopFields.tsx';
import { foldSummaries } from './foldSummaries.ts';

/** What few beers need, folded away under what it says now. */
export function RareFields() {
  const board = useBoard();
  const { control } = useFormContext<BatchValues>();
  const summaries = foldSummaries(useWatch({ control }) as BatchValues, board);
  return (
    <div className="space-y-3">
      <FoldedFields
        title="Hops and additions"
        summary={summaries.goesIn}
        names={['dryHops', 'additions']}
      >
        <DryHopFields />
        <AdditionFields />
      </FoldedFields>
      <FoldedFields
        title="Allergens and cultures"
        summary={summaries.carries}
        names={['allergens', 'cultures']}
      >
        <CarriedFields />
      </FoldedFields>
      <FoldedFields
        title="Vessel, yeast, notes"
        summary={summaries.place}
        names={['trub', 'vesselId', 'yeastId', 'notes']}
      >
        <PlaceFields />
      </FoldedFields>
    </div>
  );
}

function CarriedFields() {
  return (
    <>
      <CheckList
        name="allergens"
        label="Allergens"
        options={optionsOf(ALLERGEN_WORDS)}
        unknown="Not known yet"
        hint="What was in any earlier beer of the chain is in this one too, whatever the dilution. Labelling law is local."
      />
      <CheckList
        name="cultures"
        label="Cultures beside the yeast"
        options={optionsOf(CULTURE_WORDS)}
        unknown="Not known yet"
        hint="They travel with the cake and can make packaged beer burst."
      />
    </>
  );
}

function PlaceFields() {
  const { yeasts, vessels } = useBoard();
  const named = (rows: readonly { id: string; name: string }[]) =>
    rows.map(({ id, name }) => ({ value: id, label: name }));
  return (
    <>
      <SelectField name="vesselId" label="Vessel" none="The shelf's" options={named(vessels)} />
      <SelectField
        name="yeastId"
        label="Yeast asked for"
        none="Whatever the shelf lives on"
        options={named(yeasts)}
      />
      <SegmentedField name="trub" label="Trub in the cake" options={optionsOf(TRUB_WORDS)} />
      <NoteField name="notes" label="Notes" />
    </>
  );
}
