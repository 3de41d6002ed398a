/** Pages of a brewery, in the order of the bar. */
export const PAGES = [
  { name: 'Board', path: '' },
  { name: 'Today', path: 'today' },
  { name: 'Yeasts', path: 'yeasts' },
  { name: 'Vessels', path: 'vessels' },
  { name: 'People', path: 'people' },
  { name: 'Season', path: 'season' },
] as const;
