import type { Request, Response } from 'express';
import type { z } from 'zod';
import type { ProblemKind } from '#shared/api/problem.ts';
import type { Member, SignedIn, Who } from '../auth/whoAsks.ts';
import type { Deps } from '../deps.ts';
import type { InRole } from '../policies.ts';
import type { Services } from '../services.ts';

/** One thing that the API does: what the router, the OpenAPI document and the tests all read. */
export interface Operation<Body = unknown> {
  /** Its name in the OpenAPI document. */
  name: string;
  method: 'get' | 'post' | 'put' | 'patch' | 'delete';
  /** As Express writes it: `/api/breweries/:brewery/board`. */
  path: string;
  summary: string;
  body?: z.ZodType<Body>;
  /** What may stand behind the question mark; the handler parses it. */
  query?: z.ZodObject;
  /** Null: an answer without content. */
  answer: z.ZodType | null;
  status: 200 | 201 | 204;
  /** The answer stays open: Server-Sent Events. */
  stream?: true;
  /** Changes a row that has a version: demands If-Match. */
  ifMatch?: boolean;
  /** Problems beyond those that follow from the rest. */
  problems?: readonly ProblemKind[];
}

export interface Answer {
  body?: unknown;
  /** Takes the answer over: it stays open. */
  stream?: (res: Response) => void;
  status?: number;
  /** Version of the one row that is answered; becomes its ETag. */
  version?: number;
}

export interface Asked<Body> extends Deps, Services {
  req: Request;
  res: Response;
  body: Body;
  params: Readonly<Record<string, string>>;
  /** The version that If-Match names; 0 where the operation asks for none. */
  version: number;
}

export interface Route {
  operation: Operation;
  who: Who;
  /** Guests may ask too; to the rest of a brewery's addresses they are strangers. */
  guests?: boolean;
  may: (member: InRole) => boolean;
  handle: (
    asked: Asked<unknown>,
    who: { signedIn: SignedIn | null; member: Member | null },
  ) => Promise<Answer>;
}
