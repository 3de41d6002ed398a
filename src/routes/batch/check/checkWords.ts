import type { CakeCheckWrite, Judgement } from '#shared/api/cakeCheck.ts';
import type { Verdict } from '#shared/rules/vocabulary.ts';

type Fault = CakeCheckWrite['faults'][number];
type Smell = CakeCheckWrite['smells'][number];
type Colour = NonNullable<CakeCheckWrite['colour']>;
type Layers = NonNullable<CakeCheckWrite['layers']>;

/** What may be wrong with a beer, with what the trade names it by. */
export const FAULT_WORDS: Record<Fault, string> = {
  sour: 'Sour',
  vinegar: 'Vinegar',
  butter: 'Butter (diacetyl)',
  'smoke-plastic': 'Smoke, clove, plastic (phenols)',
  solvent: 'Solvent (fusels, esters)',
  sulphur: 'Sulphur',
  'green-apple': 'Green apple (acetaldehyde)',
  meaty: 'Meat, broth (autolysis)',
  papery: 'Paper, sherry (oxidised)',
  musty: 'Musty',
};

export const SMELL_WORDS: Record<Smell, string> = {
  bread: 'Bread',
  fruit: 'Fruit',
  hops: 'Hops',
  butter: 'Butter',
  sulphur: 'Sulphur',
  vinegar: 'Vinegar',
  'smoke-plastic': 'Smoke, plastic',
  meaty: 'Meat, broth',
};

export const COLOUR_WORDS: Record<Colour, { label: string; ground: string }> = {
  cream: { label: 'Cream', ground: 'bg-cake' },
  tan: { label: 'Tan', ground: 'bg-cake-d' },
  'green-flecks': { label: 'Green flecks', ground: 'bg-hop' },
  brown: { label: 'Brown', ground: 'bg-on-cake' },
  grey: { label: 'Grey', ground: 'bg-edge' },
};

export const LAYER_WORDS: Record<Layers, string> = {
  one: 'One layer',
  'trub-on-top': 'Trub on top',
  'trub-below': 'Trub below',
  mixed: 'Mixed',
};

export const FIT_WORDS: Record<Judgement, { word: string; means: string; verdict: Verdict }> = {
  fit: { word: 'Fit', means: 'clean, reuse', verdict: 'pour' },
  'with-care': { word: 'With care', means: 'reuse with care', verdict: 'mind' },
  unfit: { word: 'Unfit', means: 'throw it out', verdict: 'hold' },
};
