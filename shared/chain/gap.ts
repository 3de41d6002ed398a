import type { Day, Verdict } from '../rules/vocabulary.ts';
import type { Lock } from './plan.ts';

/** A place for a lifted batch, judged as the drop would make it. */
export interface Gap {
  /** `chainId:afterId`, `chainId:first`, `new` or `bench`. */
  key: string;
  /** A chain, `new` or `bench`. */
  toChainId: string;
  /** Null: first there. */
  afterBatchId: string | null;
  /** The batch stands here now. */
  here: boolean;
  /** Why nothing can be put here; then nothing else is judged. */
  locked: Lock | null;
  /** The worst over the links that the drop would change. */
  verdict: Verdict;
  /** Findings over those links. */
  holds: number;
  minds: number;
  /** When the lifted batch would be brewed; null: not known. */
  brewOn: Day | null;
  /** Short titles, worst first. */
  reasons: string[];
  /** Largest ΔE00 over those links; 0 without a link; null where one is not known. */
  colourShift: number | null;
  best: boolean;
  /** Of the lifted batch there; null: not known, or the bench. */
  generation: number | null;
  /** Links that would come about, or be judged otherwise than now; `pour` where a link ends. */
  changes: { laterId: string; verdict: Verdict }[];
}
