import type { YeastKind } from '../rules/vocabulary.ts';

export type Range = readonly [low: number, high: number];

/** What beers of a style usually are. A help for filling in a plan, never a limit. */
export interface BeerStyle {
  /** As the trade says it. */
  name: string;
  kind: YeastKind;
  og: Range;
  fg: Range;
  ibu: Range;
  srm: Range;
  /** % by volume. */
  abv: Range;
}

const style = (
  name: string,
  kind: YeastKind,
  og: Range,
  fg: Range,
  ibu: Range,
  srm: Range,
  abv: Range,
): BeerStyle => ({ name, kind, og, fg, ibu, srm, abv });

/** Usual ranges, from pale and mild to dark and strong. Common practice, from memory. */
export const STYLES: readonly BeerStyle[] = [
  style('Light lager', 'lager', [1.028, 1.042], [0.998, 1.009], [6, 14], [2, 4], [2.8, 4.3]),
  style('Pale lager', 'lager', [1.042, 1.052], [1.007, 1.012], [14, 26], [2, 5], [4.2, 5.4]),
  style('Pilsner', 'lager', [1.044, 1.058], [1.008, 1.016], [24, 44], [2, 6], [4.3, 5.6]),
  style('Amber lager', 'lager', [1.046, 1.058], [1.01, 1.015], [18, 30], [8, 16], [4.5, 5.9]),
  style('Dark lager', 'lager', [1.044, 1.056], [1.01, 1.016], [16, 30], [16, 30], [4.2, 5.6]),
  style('Doppelbock', 'lager', [1.072, 1.106], [1.016, 1.026], [16, 28], [7, 25], [6.9, 10]),
  style('Baltic porter', 'lager', [1.062, 1.092], [1.015, 1.025], [20, 42], [18, 32], [6.4, 9.5]),
  style('Sour wheat beer', 'ale', [1.028, 1.036], [1.003, 1.008], [2, 9], [2, 4], [2.7, 4]),
  style('Wheat beer', 'ale', [1.044, 1.054], [1.009, 1.014], [8, 18], [3, 8], [4.3, 5.7]),
  style('Cream ale', 'ale', [1.042, 1.054], [1.006, 1.012], [8, 22], [2, 5], [4.2, 5.7]),
  style('Kölsch', 'ale', [1.044, 1.051], [1.007, 1.012], [16, 30], [3, 5], [4.3, 5.3]),
  style('Blonde ale', 'ale', [1.038, 1.054], [1.008, 1.013], [14, 28], [3, 7], [3.8, 5.6]),
  style('Saison', 'ale', [1.044, 1.066], [1.001, 1.009], [18, 36], [4, 10], [4.8, 7.5]),
  style('Best bitter', 'ale', [1.038, 1.049], [1.008, 1.013], [24, 42], [8, 17], [3.7, 4.8]),
  style('Mild', 'ale', [1.03, 1.039], [1.008, 1.013], [10, 24], [12, 26], [2.8, 3.9]),
  style('Brown ale', 'ale', [1.04, 1.056], [1.009, 1.015], [18, 32], [14, 26], [4, 5.7]),
  style('Pale ale', 'ale', [1.045, 1.059], [1.01, 1.015], [28, 48], [5, 11], [4.4, 6.1]),
  style('IPA', 'ale', [1.056, 1.071], [1.008, 1.015], [42, 72], [5, 14], [5.5, 7.6]),
  style('Double IPA', 'ale', [1.066, 1.086], [1.009, 1.018], [60, 100], [5, 14], [7.3, 10]),
  style('Porter', 'ale', [1.042, 1.058], [1.009, 1.016], [18, 38], [20, 34], [4.2, 5.8]),
  style('Dry stout', 'ale', [1.036, 1.046], [1.007, 1.012], [25, 44], [26, 40], [3.7, 5]),
  style('Milk stout', 'ale', [1.046, 1.062], [1.014, 1.024], [20, 38], [30, 42], [4, 6]),
  style('Oatmeal stout', 'ale', [1.046, 1.066], [1.011, 1.018], [24, 40], [24, 40], [4.3, 6.2]),
  style('Imperial stout', 'ale', [1.076, 1.114], [1.018, 1.03], [50, 90], [30, 46], [7.9, 12]),
  style('Barley wine', 'ale', [1.08, 1.118], [1.018, 1.03], [36, 75], [8, 22], [8, 12]),
];

const plain = (name: string): string => name.trim().toLocaleLowerCase('en');

/** The style of that name, however it is capitalised; undefined for the brewer's own words. */
export const styleNamed = (name: string): BeerStyle | undefined =>
  STYLES.find((known) => plain(known.name) === plain(name));
