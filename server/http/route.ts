import { notFound, problem } from '../problems.ts';
import type { Member, SignedIn } from '../auth/whoAsks.ts';
import { canRead, type InRole } from '../policies.ts';
import type { Answer, Asked, Operation, Route } from './operation.ts';

/**
 * The three ways to make a route. They differ in who may ask; the handler gets what was parsed,
 * so behind this border types are exact.
 */

export function forAnyone<Body>(
  operation: Operation<Body>,
  handle: (asked: Asked<Body>) => Promise<Answer>,
): Route {
  return {
    operation,
    who: 'anyone',
    may: canRead,
    handle: (asked) => handle(asked as Asked<Body>),
  };
}

export function forSignedIn<Body>(
  operation: Operation<Body>,
  handle: (asked: Asked<Body>, signedIn: SignedIn) => Promise<Answer>,
): Route {
  return {
    operation,
    who: 'signed-in',
    may: canRead,
    handle: (asked, { signedIn }) => {
      if (!signedIn) throw problem('not-signed-in');
      return handle(asked as Asked<Body>, signedIn);
    },
  };
}

export function forMember<Body>(
  operation: Operation<Body>,
  may: (member: InRole) => boolean,
  handle: (asked: Asked<Body>, member: Member) => Promise<Answer>,
  /** People of other breweries may ask for it too, for what is on their chain. */
  guests: 'guests-too' | 'members-only' = 'members-only',
): Route {
  return {
    operation,
    who: 'member',
    guests: guests === 'guests-too',
    may,
    handle: (asked, { member }) => {
      if (!member) throw notFound();
      return handle(asked as Asked<Body>, member);
    },
  };
}
