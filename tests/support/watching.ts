import { LIVE_EVENTS, type LiveEventName, type LiveEvents } from '#shared/api/live.ts';
import { api } from '#shared/api/urls.ts';
import type { Visitor } from './visitor.ts';

type Told = {
  [K in LiveEventName]: { name: K; data: LiveEvents[K]; id: string | null };
}[LiveEventName];

/** A stream that is read; every event is checked against its contract. */
export class Watching {
  readonly told: Told[] = [];
  beats = 0;
  isEnded = false;
  readonly #stop = new AbortController();
  #wake = () => {};

  /** @param since asked for as a browser would that comes back */
  static async open(visitor: Visitor, slug: string, seasonId: string, since?: number) {
    const made = new Watching();
    const response = await fetch(visitor.base + api.seasonEvents(slug, seasonId), {
      headers: {
        Cookie: visitor.cookie,
        ...(since !== undefined && { 'Last-Event-ID': String(since) }),
      },
      signal: made.#stop.signal,
    });
    if (response.status !== 200) throw new Error(`The stream answered ${response.status}`);
    void made.#read(response).catch(() => undefined);
    return made;
  }

  close(): void {
    this.#stop.abort();
  }

  /** The first event of this name that fits, told already or still to come. */
  async heard<K extends LiveEventName>(
    name: K,
    fits: (data: LiveEvents[K]) => boolean = () => true,
    patienceMs = 5_000,
  ): Promise<LiveEvents[K]> {
    return this.#until(() => this.all(name).find(fits), `an event "${name}"`, patienceMs);
  }

  ended(patienceMs = 5_000): Promise<true> {
    return this.#until(() => this.isEnded || undefined, 'the end', patienceMs);
  }

  /** Until two more heartbeats: what was gathered for this stream before has come by then. */
  quiet(patienceMs = 5_000): Promise<true> {
    const enough = this.beats + 2;
    return this.#until(() => this.beats >= enough || undefined, 'a heartbeat', patienceMs);
  }

  all<K extends LiveEventName>(name: K): LiveEvents[K][] {
    return this.told.flatMap((one) => (one.name === name ? [one.data as LiveEvents[K]] : []));
  }

  async #until<T>(look: () => T | undefined, what: string, patienceMs: number): Promise<T> {
    const end = performance.now() + patienceMs;
    for (;;) {
      const found = look();
      if (found !== undefined) return found;
      const left = end - performance.now();
      if (left <= 0) throw new Error(`Waited for ${what}; heard ${JSON.stringify(this.told)}`);
      await new Promise<void>((resolve) => {
        const timer = setTimeout(resolve, left);
        this.#wake = () => {
          clearTimeout(timer);
          resolve();
        };
      });
    }
  }

  async #read({ body }: Response): Promise<void> {
    let text = '';
    try {
      for await (const part of body?.pipeThrough(new TextDecoderStream()) ?? []) {
        text += part;
        const blocks = text.split('\n\n');
        text = blocks.pop() ?? '';
        for (const block of blocks) this.#take(block);
        this.#wake();
      }
    } finally {
      this.isEnded = true;
      this.#wake();
    }
  }

  #take(block: string): void {
    if (block.startsWith(':')) return void (this.beats += 1);
    const field = (name: string) => new RegExp(`^${name}: (.*)$`, 'm').exec(block)?.[1] ?? null;
    const name = field('event') as LiveEventName;
    const data = LIVE_EVENTS[name].parse(JSON.parse(field('data') ?? ''));
    this.told.push({ name, data, id: field('id') } as Told);
  }
}
