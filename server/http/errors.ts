import type { ErrorRequestHandler } from 'express';
import pg from 'pg';
import { z } from 'zod';
import { PROBLEMS } from '#shared/api/problem.ts';
import { problem, ProblemError, problemDocument } from '../problems.ts';

/** Every issue of a parse, each at its field (RFC 6901 pointer). */
export function fromZod(error: z.ZodError): ProblemError {
  const errors = error.issues.flatMap((issue) =>
    issue.code === 'unrecognized_keys'
      ? issue.keys.map((key) => ({
          detail: 'This is not known here',
          pointer: pointerTo([...issue.path, key]),
        }))
      : [{ detail: issue.message, pointer: pointerTo(issue.path) }],
  );
  return problem('invalid-request', { errors });
}

const pointerTo = (path: readonly PropertyKey[]) =>
  path.map((part) => `/${String(part).replaceAll('~', '~0').replaceAll('/', '~1')}`).join('');

/** Values that a schema let through and the database refuses: the sender's fault, not the server's. */
const REFUSED_VALUE = /^22/;
const STILL_REFERRED_TO = '23503';
/** Two at once, or a database that is restarting: the same request may succeed in a moment. */
const PASSING = /^(40001|40P01|53|55P03|57|08)/;
const LOST_CONNECTION =
  /ECONNREFUSED|ECONNRESET|EPIPE|ETIMEDOUT|Connection terminated|connection error|timeout exceeded when trying to connect/;

/** Node names the fault in `code`, the database's client in a sentence. */
const isLostConnection = (error: unknown): boolean =>
  error instanceof Error &&
  LOST_CONNECTION.test(`${'code' in error ? error.code : ''} ${error.message}`);

function rootCause(error: unknown): unknown {
  return error instanceof Error && error.cause instanceof Error ? rootCause(error.cause) : error;
}

function fromDatabase(error: unknown): ProblemError | null {
  const cause = rootCause(error);
  if (cause instanceof pg.DatabaseError) {
    if (REFUSED_VALUE.test(cause.code ?? '')) return problem('invalid-request');
    if (cause.code === STILL_REFERRED_TO) return problem('in-use');
    if (PASSING.test(cause.code ?? '')) return problem('busy', { retryAfter: 1 });
  }
  if (isLostConnection(cause)) return problem('busy', { retryAfter: 2 });
  return null;
}

/** What Express and its body reader throw carries a status of its own. */
function fromHttp(error: unknown): ProblemError | null {
  const status = error instanceof Error && 'status' in error ? error.status : undefined;
  switch (status) {
    case 413:
      return problem('too-large');
    case 415:
      return problem('not-json');
    case 404:
      return problem('not-found');
    default:
      return typeof status === 'number' && status >= 400 && status < 500
        ? problem('unreadable-body')
        : null;
  }
}

export function toProblem(error: unknown): ProblemError {
  if (error instanceof ProblemError) return error;
  if (error instanceof z.ZodError) return fromZod(error);
  return fromDatabase(error) ?? fromHttp(error) ?? problem('unexpected');
}

/** Without the values of the statement, which may be anybody's. */
function loggable(error: unknown): unknown {
  const cause = rootCause(error);
  if (!(cause instanceof pg.DatabaseError)) return cause;
  const { message, code, table, column, constraint, routine, stack } = cause;
  return { message, code, table, column, constraint, routine, stack };
}

/** The last word on every failed request: a problem document, and for the unknown a line in the log. */
export const answerErrors: ErrorRequestHandler = (error: unknown, req, res, next) => {
  const known = toProblem(error);
  if (known.kind === 'unexpected') req.log.error({ err: loggable(error) }, 'Request failed');
  if (res.headersSent) return next(error);
  if (known.options.retryAfter !== undefined)
    res.setHeader('Retry-After', String(known.options.retryAfter));
  res
    .status(PROBLEMS[known.kind].status)
    .type('application/problem+json')
    .send(JSON.stringify(problemDocument(known, String(req.id))));
};
