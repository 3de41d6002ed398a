import { z } from 'zod';
import * as f from './fields.ts';

/**
 * What a season's stream tells (Server-Sent Events): the name of the event, and its data as JSON.
 * It carries no content: whoever hears of a revision reads the board.
 */
export const LIVE_EVENTS = {
  /** First on every stream. Between events a comment is sent this often, so that silence means loss. */
  hello: z.strictObject({ beatMs: z.number().positive() }),
  /** The season's revision, which is also the event's id. */
  revision: z.strictObject({ revision: z.number().int().min(0) }),
  /** Something changed on a chain that stands on this person's board as a guest; not which, nor what. */
  elsewhere: z.strictObject({}),
  /** Everybody who has the season open, oneself included. */
  here: z.strictObject({ people: z.array(f.id) }),
  /** The last event: asking again is of no use. */
  ended: z.strictObject({ why: z.enum(['signed-out', 'not-a-member']) }),
} as const;

export type LiveEvents = { [K in keyof typeof LIVE_EVENTS]: z.infer<(typeof LIVE_EVENTS)[K]> };
export type LiveEventName = keyof LiveEvents;
export type Ended = LiveEvents['ended']['why'];

/** Where a client stands; absent: nowhere yet. */
export const liveQuery = z.object({ since: z.coerce.number().int().min(0).optional() });
