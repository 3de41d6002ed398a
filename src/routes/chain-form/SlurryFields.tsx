import { useFormContext, useWatch } from 'react-hook-form';
import type { Allergen, Culture } from '#shared/rules/vocabulary.ts';
import { ALLERGEN_WORDS, CULTURE_WORDS, optionsOf } from '../../app/traitWords.ts';
import { CheckList } from '../../components/form/CheckList.tsx';
import { FoldedFields } from '../../components/form/FoldedFields.tsx';
import { broughtAlongWords } from './chainWords.ts';

/** What slurry from elsewhere brings into every beer of the shelf. */
export function SlurryFields() {
  const { control } = useFormContext();
  const [allergens, cultures] = useWatch({
    control,
    name: ['start.allergens', 'start.cultures'],
  }) as [Allergen[] | null, Culture[] | null];
  return (
    <FoldedFields
      title="What the slurry brings along"
      summary={broughtAlongWords(allergens, cultures)}
      names={['start.allergens', 'start.cultures']}
    >
      <CheckList
        name="start.allergens"
        label="Allergens of the beers before it"
        options={optionsOf(ALLERGEN_WORDS)}
        unknown="Not known yet"
        hint="Ask whoever gave you the slurry. No dilution removes an allergen; labelling law is local."
      />
      <CheckList
        name="start.cultures"
        label="Cultures beside the yeast"
        options={optionsOf(CULTURE_WORDS)}
        unknown="Not known yet"
        hint="They travel with the slurry and can make packaged beer burst."
      />
    </FoldedFields>
  );
}
