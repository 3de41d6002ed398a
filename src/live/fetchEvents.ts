import { api } from '#shared/api/urls.ts';
import { setReachable } from '../api/connection.ts';
import { Refused, type Hearing } from './connection.ts';
import { createEventReader } from './readEvents.ts';

/**
 * Reads a season's stream until it ends. Not with EventSource: that hides the heartbeats, and why a
 * stream was refused.
 */
export async function fetchEvents(
  { slug, seasonId, since }: { slug: string; seasonId: string; since: number | null },
  hearing: Hearing,
  signal: AbortSignal,
): Promise<void> {
  const query = since === null ? '' : `?since=${since}`;
  const response = await fetch(api.seasonEvents(slug, seasonId) + query, {
    headers: { Accept: 'text/event-stream' },
    credentials: 'same-origin',
    cache: 'no-store',
    signal,
  }).catch((error: unknown) => {
    if (!signal.aborted) setReachable(false);
    throw error;
  });
  setReachable(true);
  if (response.status === 401) throw new Refused('signed-out');
  if (response.status === 403 || response.status === 404) throw new Refused('not-a-member');
  if (!response.ok || !response.body) throw new Error(`The stream answered ${response.status}`);
  const read = createEventReader(hearing.event, hearing.beat);
  const reader = response.body.pipeThrough(new TextDecoderStream()).getReader();
  for (let part = await reader.read(); !part.done; part = await reader.read()) read(part.value);
}
