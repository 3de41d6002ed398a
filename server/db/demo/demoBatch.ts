import type { BatchCreate, Stage } from '#shared/api/batch.ts';

/** A batch of the demo; days count from the season's first brew day. */
export interface DemoBatch {
  plan: Omit<BatchCreate, 'id' | 'brewOn' | 'wantedOn' | 'vesselId' | 'yeastId' | 'typed'>;
  brewDay: number | null;
  stage: Exclude<Stage, 'scrapped'>;
  /** What became of its cake, where that was not poured. */
  dumped?: true;
  read?: { volumeL?: number; og?: number; fg?: number; rackDay?: number };
}
