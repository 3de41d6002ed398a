import { api } from '#shared/api/urls.ts';
import { createEventReader } from '../../../src/live/readEvents.ts';
import type { AtWork } from './atWork.ts';

export interface Listener {
  /** When it heard of each revision, milliseconds of this process's clock. */
  heard: Map<number, number>;
  close(): void;
}

/** An open stream that notes when it hears of what; open once it was told where the season is. */
export async function openListener(at: AtWork, cookie: string): Promise<Listener> {
  const stop = new AbortController();
  const { slug, seasonId } = at.brewery;
  const answer = await fetch(at.url + api.seasonEvents(slug, seasonId), {
    headers: { cookie },
    signal: stop.signal,
  });
  if (answer.status !== 200 || !answer.body)
    throw new Error(`a stream was answered ${answer.status}`);
  const heard = new Map<number, number>();
  const reader = answer.body.pipeThrough(new TextDecoderStream()).getReader();
  await new Promise<void>((opened, failed) => {
    const read = createEventReader(
      ({ name, data }) => {
        if (name !== 'revision') return;
        heard.set(data.revision, performance.now());
        opened();
      },
      () => undefined,
    );
    const pump = async () => {
      for (let part = await reader.read(); !part.done; part = await reader.read()) read(part.value);
    };
    pump().catch(failed);
  });
  return { heard, close: () => stop.abort() };
}
