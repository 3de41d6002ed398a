import type { Stage } from '#shared/api/batch.ts';

export type NextStage = Stage;

/** What the menu and the question call a change of stage. */
export const STAGE_ACTIONS: Record<NextStage, { menu: string; title: string; action: string }> = {
  pencilled: { menu: 'Back to pencilled', title: 'Back to pencilled', action: 'Put back' },
  fermenting: {
    menu: 'It is brewed',
    title: 'Brewed and fermenting',
    action: 'Mark as fermenting',
  },
  racked: { menu: 'It is racked', title: 'Racked', action: 'Mark as racked' },
  scrapped: { menu: 'Scrap', title: 'Scrap this batch', action: 'Scrap it' },
};

/** The stages that may be chosen from one, the usual next one first. */
export function nextStages(stage: Stage): readonly NextStage[] {
  switch (stage) {
    case 'pencilled':
      return ['fermenting', 'scrapped'];
    case 'fermenting':
      return ['racked', 'pencilled', 'scrapped'];
    case 'racked':
      return ['fermenting', 'scrapped'];
    case 'scrapped':
      return ['pencilled'];
  }
}
