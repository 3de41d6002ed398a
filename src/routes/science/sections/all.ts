import type { ScienceSection } from '../section.ts';
import { alcohol, gravity } from './beer.tsx';
import { colour, colourDifference } from './colour.tsx';
import { blending, cooling, keep, room, window } from './pour.tsx';
import { growth, need, survival } from './yeast.tsx';

/** In the order in which one rests on another. */
export const SECTIONS: readonly ScienceSection[] = [
  gravity,
  alcohol,
  growth,
  survival,
  need,
  keep,
  blending,
  colour,
  colourDifference,
  room,
  window,
  cooling,
];
