import { PROBLEMS, type Problem, type ProblemKind } from '#shared/api/problem.ts';

export interface ProblemOptions {
  /** One sentence on what is wrong and what to do. */
  detail?: string;
  errors?: Problem['errors'];
  /** On a conflict: how it stands now. */
  current?: unknown;
  /** Seconds. */
  retryAfter?: number;
}

/** An expected failure on its way to the error mapper, which writes the document. */
export class ProblemError extends Error {
  constructor(
    readonly kind: ProblemKind,
    readonly options: ProblemOptions = {},
  ) {
    super(options.detail ?? PROBLEMS[kind].title);
    this.name = 'ProblemError';
  }
}

export const problem = (kind: ProblemKind, options?: ProblemOptions) =>
  new ProblemError(kind, options);

/** What does not exist, or belongs to another brewery: the two look the same. */
export const notFound = () => problem('not-found');

/** One field that cannot be taken, as the schemas would say it. */
export const invalidField = (pointer: string, detail: string) =>
  problem('invalid-request', { errors: [{ detail, pointer }] });

/** The RFC 9457 document. `type` is the kind's own address under `/problems/`. */
export function problemDocument(error: ProblemError, requestId: string): Problem {
  const { status, title } = PROBLEMS[error.kind];
  const { detail, errors, current } = error.options;
  return {
    type: `/problems/${error.kind}`,
    title,
    status,
    ...(detail !== undefined && { detail }),
    instance: requestId,
    ...(errors !== undefined && { errors }),
    ...(current !== undefined && { current }),
  };
}
