import { z } from 'zod';

/** Every problem the server may answer, RFC 9457. `type` is this key under `/problems/`. */
export const PROBLEMS = {
  'invalid-request': { status: 422, title: 'Some of this cannot be taken as it is' },
  'unreadable-body': { status: 400, title: 'The request could not be read' },
  'too-large': { status: 413, title: 'The request is too large' },
  'not-json': { status: 415, title: 'Send JSON' },
  'not-signed-in': { status: 401, title: 'Sign in first' },
  'wrong-sign-in': { status: 401, title: 'The e-mail address or the password is wrong' },
  'cross-site': { status: 403, title: 'This request came from another site' },
  'not-allowed': { status: 403, title: 'Your role does not allow this' },
  'not-found': { status: 404, title: 'There is nothing here' },
  'method-not-allowed': { status: 405, title: 'This cannot be done here' },
  'moved-elsewhere': { status: 409, title: 'The batch is somewhere else by now' },
  'place-taken': { status: 409, title: 'The place is not there any more' },
  'not-undoable': { status: 409, title: 'This can no longer be undone' },
  'in-use': { status: 409, title: 'It is still in use' },
  'last-head-brewer': { status: 409, title: 'A brewery always has a head brewer' },
  'already-exists': { status: 409, title: 'It exists already' },
  'season-archived': { status: 409, title: 'This season is archived: it is read, not changed' },
  'not-acceptable': { status: 409, title: 'This hold cannot be accepted' },
  'pour-held': { status: 409, title: 'Somebody else has this pour in hand' },
  'pour-over': { status: 409, title: 'This pour is over' },
  'not-cleared': { status: 409, title: 'This cannot be cleared' },
  'link-used': { status: 410, title: 'This link is no longer good' },
  'contract-ended': { status: 410, title: 'This page is too old for the server: reload it' },
  'changed-since': { status: 412, title: 'Somebody changed it in the meantime' },
  'version-missing': { status: 428, title: 'Say which version you changed' },
  'too-many': { status: 429, title: 'Too many tries' },
  busy: { status: 503, title: 'Busy, try again in a moment' },
  unexpected: { status: 500, title: 'Something went wrong here' },
} as const;
export type ProblemKind = keyof typeof PROBLEMS;

export const problem = z.object({
  type: z.string(),
  title: z.string(),
  status: z.number().int(),
  detail: z.string().optional(),
  /** The request's id in the log. */
  instance: z.string().optional(),
  errors: z.array(z.strictObject({ detail: z.string(), pointer: z.string() })).optional(),
  /** On a conflict: the row as it is now, or where the batch is. */
  current: z.unknown().optional(),
});
export type Problem = z.infer<typeof problem>;
