import type { DemoBatch } from './demoBatch.ts';

type Figures = [og: number, fg: number, srm: number, ibu: number, fermentC: number, days: number];

/** A beer of 23 L by its figures. */
export function plan(name: string, style: string, figures: Figures): DemoBatch['plan'] {
  const [og, fg, srm, ibu, fermentC, daysUnderBeer] = figures;
  return {
    name,
    style,
    volumeL: 23,
    og,
    fg,
    srm,
    ibu,
    fermentC,
    daysUnderBeer,
    dryHops: [],
    additions: [],
    allergens: ['gluten'],
    cultures: [],
    trub: 'some',
    notes: '',
  };
}
