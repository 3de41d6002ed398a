import type { Page } from '@playwright/test';
import type { BoardPlan } from './board.ts';
import { dayFromToday } from './days.ts';

/** A pale ale that ferments, with the next wort planned for its cake. */
export const BREWED: BoardPlan = {
  shelves: [
    {
      name: 'Clean ale',
      batches: [
        {
          name: 'Ebb Pale',
          style: 'American pale ale',
          og: 1.05,
          fg: 1.012,
          srm: 7,
          brewOn: dayFromToday(-11),
          stage: 'fermenting',
          readOg: 1.05,
          readVolumeL: 22,
        },
        { name: 'Withy Bitter', og: 1.048, fg: 1.011, srm: 10, ibu: 30, brewOn: '2027-04-03' },
      ],
    },
  ],
};

/** Fills fields by their labels. */
export async function fill(page: Page, fields: Readonly<Record<string, string>>): Promise<void> {
  for (const [label, text] of Object.entries(fields)) await page.getByLabel(label).fill(text);
}
