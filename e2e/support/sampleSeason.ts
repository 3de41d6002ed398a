import type { BoardPlan } from './board.ts';

/** A season in which every verdict, every stage and the bench are to be seen. */
export const SAMPLE: BoardPlan = {
  shelves: [
    {
      name: 'Clean ale',
      batches: [
        {
          name: 'Creek Blonde',
          style: 'Blonde ale',
          stage: 'racked',
          brewOn: '2026-09-05',
          rackedOn: '2026-09-19',
        },
        { name: 'Ebb Pale', og: 1.052, fg: 1.013, srm: 7, ibu: 38, brewOn: '2027-03-20' },
        { name: 'Long Night', og: 1.095, fg: 1.024, srm: 42, ibu: 60, brewOn: '2027-04-03' },
        { name: 'Gull Wheat', og: 1.045, fg: 1.011, srm: 4, ibu: 15, brewOn: '2027-04-17' },
      ],
    },
    {
      name: 'House ale',
      batches: [
        { name: 'Reed Bitter', og: 1.046, fg: 1.012, srm: 10, ibu: 32, brewOn: '2027-03-07' },
        {
          name: 'Fog Bank',
          og: 1.062,
          fg: 1.015,
          srm: 7,
          ibu: 58,
          brewOn: '2027-03-21',
          dryHops: [{ gramsPerLitre: 8, contained: 'loose', timing: 'on-cake' }],
        },
        { name: 'Lantern Stout', og: 1.06, fg: 1.015, srm: 35, ibu: 62, brewOn: '2027-04-04' },
      ],
    },
  ],
  bench: [
    { name: 'Kelp Rye', og: 1.056, fg: 1.014, srm: 12, ibu: 34 },
    { name: 'Withy Mild', og: null, fg: null, srm: null, ibu: null },
  ],
};
