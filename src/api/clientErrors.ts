import { api } from '#shared/api/urls.ts';
import { OfflineError, ProblemError } from './errors.ts';

const told = new Set<string>();

/** Tells the server's log about a fault in the page, once each. Never what somebody typed. */
export function reportClientError(error: unknown, where: string) {
  if (error instanceof OfflineError || error instanceof ProblemError) return;
  const message = error instanceof Error ? `${error.name}: ${error.message}` : String(error);
  if (told.has(message) || told.size > 20) return;
  told.add(message);
  const stack = error instanceof Error ? (error.stack ?? '') : '';
  void fetch(api.clientErrors, {
    method: 'POST',
    headers: { 'Content-Type': 'application/json' },
    body: JSON.stringify({
      message: message.slice(0, 500),
      stack: stack.slice(0, 4000),
      page: where.slice(0, 200),
    }),
    keepalive: true,
  }).catch(() => undefined);
}
