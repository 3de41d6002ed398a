import { problemOf, send } from '../api/client.ts';
import { OfflineError, ProblemError } from '../api/errors.ts';
import type { Entry, Outcome } from './entry.ts';

/** A weak network may take a request and never answer it. */
const PATIENCE_MS = 20_000;

/** Sends one entry, under the contract that it was written under. */
export async function sendEntry(entry: Entry): Promise<Outcome> {
  const { method, url, body, ifMatch, contract } = entry;
  const signal = AbortSignal.timeout(PATIENCE_MS);
  try {
    const response = await send(method, url, {
      contract,
      signal,
      ...(body !== undefined && { body }),
      ...(ifMatch !== undefined && { ifMatch }),
    });
    return await outcomeOf(response);
  } catch (error) {
    if (error instanceof OfflineError) return { kind: 'lost' };
    throw error;
  }
}

async function outcomeOf(response: Response): Promise<Outcome> {
  if (response.ok) {
    if (response.status === 204) return { kind: 'done', answer: undefined };
    const answer: unknown = await response.json().catch(() => undefined);
    // The sign-in page of a guest network answers "all is well" in the place of the server.
    return answer === undefined ? { kind: 'lost' } : { kind: 'done', answer };
  }
  const error = problemOf(response, await response.json().catch(() => undefined));
  if (!(error instanceof ProblemError)) return { kind: response.status < 500 ? 'lost' : 'later' };
  switch (error.kind) {
    case 'busy':
    case 'too-many':
    case 'not-signed-in':
      return { kind: 'later' };
    default:
      return { kind: 'refused', refusal: refusalOf(error) };
  }
}

const refusalOf = (error: ProblemError) => ({
  status: error.status,
  kind: error.kind,
  sentence: error.problem.detail ?? `${error.problem.title}.`,
  errors: error.problem.errors ?? [],
  ...(error.problem.current !== undefined && { current: error.problem.current }),
});

/** The refusal as the pages show every other problem. */
export const problemFrom = (entry: Entry): ProblemError | null =>
  entry.refusal &&
  new ProblemError({
    type: `/problems/${entry.refusal.kind ?? ''}`,
    title: entry.refusal.sentence,
    status: entry.refusal.status,
    detail: entry.refusal.sentence,
    errors: entry.refusal.errors,
    current: entry.refusal.current,
  });
