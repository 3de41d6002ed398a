import type { z } from 'zod';
import { CONTRACT, CONTRACT_HEADER } from '#shared/api/contract.ts';
import { problem } from '#shared/api/problem.ts';
import { setReachable } from './connection.ts';
import { OfflineError, ProblemError, UnexpectedAnswerError } from './errors.ts';

export interface RequestOptions {
  body?: unknown;
  /** Row version that this change was made from. */
  ifMatch?: number;
  /** Under which this was written; left out: the one in force. */
  contract?: number;
  signal?: AbortSignal;
}

type Method = 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';

/**
 * Asks the server and parses its answer. Throws `ProblemError` for a problem document and
 * `OfflineError` when no answer came.
 */
export async function request<T>(
  schema: z.ZodType<T>,
  method: Method,
  url: string,
  options: RequestOptions = {},
): Promise<T> {
  const response = await send(method, url, options);
  const content = await contentOf(response, method);
  if (!response.ok) throw problemOf(response, content);
  const parsed = schema.safeParse(content);
  if (!parsed.success)
    throw new UnexpectedAnswerError(`${method} ${url}: ${parsed.error.issues[0]?.message ?? ''}`);
  return parsed.data;
}

/** For answers without content. */
export async function requestNothing(method: Method, url: string, options: RequestOptions = {}) {
  const response = await send(method, url, options);
  if (response.ok) return;
  throw problemOf(response, await contentOf(response, method));
}

/** The bare answer, whatever it says. Throws `OfflineError` when none came. */
export async function send(
  method: Method,
  url: string,
  { body, ifMatch, contract = CONTRACT, signal }: RequestOptions,
) {
  const headers: Record<string, string> = {
    Accept: 'application/json',
    [CONTRACT_HEADER]: String(contract),
  };
  if (body !== undefined) headers['Content-Type'] = 'application/json';
  if (ifMatch !== undefined) headers['If-Match'] = `"${ifMatch}"`;
  try {
    const response = await fetch(url, {
      method,
      headers,
      credentials: 'same-origin',
      ...(body !== undefined && { body: JSON.stringify(body) }),
      ...(signal && { signal }),
    });
    setReachable(true);
    return response;
  } catch (error) {
    throw lost(error, method);
  }
}

/** Undefined where it is no JSON. The connection may be lost in the middle of an answer too. */
async function contentOf(response: Response, method: Method): Promise<unknown> {
  try {
    return await response.json();
  } catch (error) {
    if (error instanceof SyntaxError) return undefined;
    throw lost(error, method);
  }
}

function lost(error: unknown, method: Method): unknown {
  if (error instanceof DOMException && error.name === 'AbortError') return error;
  setReachable(false);
  return new OfflineError(method === 'GET' ? 'to-read' : 'to-write');
}

/** What an answer that is not good says. */
export function problemOf(response: Response, content: unknown): Error {
  const parsed = problem.safeParse(content);
  if (parsed.success) return new ProblemError(parsed.data);
  return new UnexpectedAnswerError(`${response.url} answered ${response.status}`);
}
