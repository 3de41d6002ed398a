import type { Day } from '../rules/vocabulary.ts';

/** What may be due, in the order in which one day's are listed. */
export const DUTY_KINDS = [
  'override',
  'pour-open',
  'signature',
  'take-yeast',
  'dry-hop',
  'rack',
  'cake-check',
  'brew',
  'jar',
  'reading',
  'event',
] as const;
export type DutyKind = (typeof DUTY_KINDS)[number];

interface Due {
  /** Tells it from every other one of a list. */
  key: string;
  /** The batch whose page or pour it opens. */
  batchId: string;
  /** The day that it is due on; before today: it is late. */
  day: Day;
}

/** Something to be done on a day. */
export type Duty = Due &
  (
    | { kind: 'override'; id: string; askedBy: string; askedAt: string; holds: string }
    | { kind: 'pour-open'; heldBy: string }
    | { kind: 'signature' }
    /** The yeast is taken apart from racking, for another batch. */
    | { kind: 'take-yeast'; forId: string }
    | { kind: 'dry-hop'; gramsPerLitre: number; yeastFirst: string | null; isUsualDay: boolean }
    | { kind: 'rack' }
    | { kind: 'cake-check'; forId: string }
    /** A brew day; with a cake to pour onto, or with fresh yeast. */
    | { kind: 'brew'; ontoId: string | null }
    | { kind: 'jar'; volumeL: number | null; generation: number }
    /** Nothing was read for some days; null: nothing at all yet. */
    | { kind: 'reading'; lastOn: Day | null }
    | { kind: 'event'; text: string }
  );
