import type { Problem, ProblemKind } from '#shared/api/problem.ts';
import { PROBLEMS } from '#shared/api/problem.ts';

/** The server answered with a problem document. */
export class ProblemError extends Error {
  override readonly name = 'ProblemError';
  readonly problem: Problem;
  readonly status: number;
  /** Null for a problem that this page does not know. */
  readonly kind: ProblemKind | null;

  constructor(problem: Problem) {
    super(problem.detail ?? problem.title);
    this.problem = problem;
    this.status = problem.status;
    this.kind = kindOf(problem.type);
  }
}

/** No answer came: the connection is gone, or the server is. */
export class OfflineError extends Error {
  override readonly name = 'OfflineError';
  constructor(asked: 'to-read' | 'to-write' = 'to-write') {
    super(
      asked === 'to-read'
        ? 'No connection to the server, and this is not kept on this device.'
        : 'No connection to the server. Nothing was saved; what you typed is still here.',
    );
  }
}

/** The server answered, but not in the shape that was agreed. */
export class UnexpectedAnswerError extends Error {
  override readonly name = 'UnexpectedAnswerError';
}

function kindOf(type: string): ProblemKind | null {
  const key = type.slice(type.lastIndexOf('/') + 1);
  return key in PROBLEMS ? (key as ProblemKind) : null;
}

export function isProblem(error: unknown, kind: ProblemKind): error is ProblemError {
  return error instanceof ProblemError && error.kind === kind;
}

/** One plain sentence for any failure. */
export function sentenceOf(error: unknown): string {
  if (error instanceof ProblemError) return error.problem.detail ?? `${error.problem.title}.`;
  if (error instanceof OfflineError) return error.message;
  return 'Something went wrong here. Try again; if it stays, reload the page.';
}

/** What the server refused at a field, where the page has only one; null for other failures. */
export const fieldSentenceOf = (error: unknown): string | null =>
  error instanceof ProblemError ? (error.problem.errors?.[0]?.detail ?? null) : null;
