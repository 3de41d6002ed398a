import { LIVE_EVENTS, type LiveEventName, type LiveEvents } from '#shared/api/live.ts';

export type LiveEvent = {
  [K in LiveEventName]: { name: K; data: LiveEvents[K] };
}[LiveEventName];

const isKnown = (name: string): name is LiveEventName => name in LIVE_EVENTS;

/**
 * Reads a stream of events as it arrives, in parts that may end anywhere. `onBeat` is told of every
 * block, comments included; what a newer server may say besides is passed over.
 */
export function createEventReader(onEvent: (event: LiveEvent) => void, onBeat: () => void) {
  let rest = '';
  return (part: string) => {
    const blocks = (rest + part).split('\n\n');
    rest = blocks.pop() ?? '';
    for (const block of blocks) {
      onBeat();
      const event = eventOf(block);
      if (event) onEvent(event);
    }
  };
}

function eventOf(block: string): LiveEvent | null {
  const field = (name: string) =>
    block
      .split('\n')
      .find((line) => line.startsWith(`${name}: `))
      ?.slice(name.length + 2);
  const name = field('event') ?? '';
  const data = field('data');
  if (!isKnown(name) || data === undefined) return null;
  const parsed = LIVE_EVENTS[name].safeParse(JSON.parse(data));
  return parsed.success ? ({ name, data: parsed.data } as LiveEvent) : null;
}
