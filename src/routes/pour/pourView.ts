import { createContext, use } from 'react';
import type { Batch } from '#shared/api/batch.ts';
import type { PourClearance, PourRun } from '#shared/api/pour.ts';
import type { PourStanding } from '#shared/pour/standing.ts';
import type { PourCommand } from '../../api/pour.ts';

/** One pour run as the page shows it now. */
export interface PourView {
  run: PourRun;
  batch: Batch;
  /** Whose cake it goes onto; null: fresh yeast. */
  cakeOf: Batch | null;
  /** The server's time, milliseconds since 1970. */
  now: number;
  standing: PourStanding;
  /** Leave to pour that holds now. */
  leave: PourClearance | null;
  /** This person holds the run and may go on with it. */
  mine: boolean;
  /** Sends a command; throws what went wrong. */
  send: (command: PourCommand) => Promise<unknown>;
  busy: boolean;
  /** What went wrong with the last command, in a sentence. */
  error: string | null;
}

export const PourViewOf = createContext<PourView | null>(null);

export function usePourView(): PourView {
  const view = use(PourViewOf);
  if (!view) throw new Error('Only inside a pour');
  return view;
}
