import express, { type Request, type RequestHandler, type Response, type Router } from 'express';
import { z } from 'zod';
import { notFound, problem } from '../problems.ts';
import { whoAsks } from '../auth/whoAsks.ts';
import type { Deps } from '../deps.ts';
import type { Services } from '../services.ts';
import { entityTag, versionAsked } from './etag.ts';
import type { Asked, Route } from './operation.ts';

const uuid = z.uuid();

/** All routes on one router; a known path with another method answers 405 with what it allows. */
export function mountRoutes(routes: readonly Route[], deps: Deps & Services): Router {
  const router = express.Router({ caseSensitive: true });
  const allowed = new Map<string, string[]>();
  for (const route of routes) {
    const { method, path } = route.operation;
    router[method](path, answering(route, deps));
    allowed.set(path, [...(allowed.get(path) ?? []), method.toUpperCase()]);
  }
  for (const [path, methods] of allowed) router.all(path, refuseMethod(methods));
  return router;
}

function refuseMethod(methods: readonly string[]): RequestHandler {
  const allow = [...methods, ...(methods.includes('GET') ? ['HEAD'] : [])].join(', ');
  return (_req, res, next) => {
    res.setHeader('Allow', allow);
    next(problem('method-not-allowed'));
  };
}

/** Who asks, may they, is it well said, then the command. Strangers learn nothing of the rest. */
function answering(route: Route, deps: Deps & Services): RequestHandler {
  return async (req, res) => {
    const who = await whoAsks(route.who, deps, req);
    if (who.member?.guestOf && !route.guests) throw notFound();
    if (who.member && !route.may(who.member)) throw problem('not-allowed');
    const answer = await route.handle(parse(route, deps, req, res), who);
    // Asked for its head alone, a stream does not begin.
    if (answer.stream && req.method === 'GET') return answer.stream(res);
    if (answer.version !== undefined) res.setHeader('ETag', entityTag(answer.version));
    res.setHeader('Cache-Control', 'no-store');
    const status = answer.status ?? route.operation.status;
    if (answer.body === undefined) res.status(status).end();
    else res.status(status).json(answer.body);
  };
}

function parse(route: Route, deps: Deps & Services, req: Request, res: Response): Asked<unknown> {
  const { operation } = route;
  return {
    ...deps,
    req,
    res,
    params: idsOf(req),
    version: operation.ifMatch ? versionAsked(req) : 0,
    body: operation.body ? operation.body.parse(bodyOf(req)) : undefined,
  };
}

/** An id that cannot be one names nothing. */
function idsOf(req: Request): Record<string, string> {
  const params: Record<string, string> = {};
  for (const [name, value] of Object.entries(req.params)) {
    const isId = /^(id|season|[a-z]+Id)$/.test(name);
    if (typeof value !== 'string' || (isId && !uuid.safeParse(value).success)) throw notFound();
    params[name] = isId ? value.toLowerCase() : value;
  }
  return params;
}

/** Express leaves the body undefined where none was sent. */
function bodyOf(req: Request): unknown {
  if (req.body === undefined) throw problem('unreadable-body', { detail: 'Send a JSON body' });
  return req.body;
}
