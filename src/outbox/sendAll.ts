import type { Entry, Outcome } from './entry.ts';
import { afterSending, nextOf, type Entries } from './queue.ts';

export interface OutboxStorage {
  read(): Promise<Entries>;
  /** In one piece: no other tab writes in between. */
  change(how: (entries: Entries) => Entries): Promise<Entries>;
}

export interface SendPorts {
  storage: OutboxStorage;
  /** Never throws. */
  send(entry: Entry): Promise<Outcome>;
  /** Told once the entries were stored, with them as they are then. */
  settled(entry: Entry, outcome: Outcome, entries: Entries): void;
}

/**
 * Sends what waits for a person, one after the other in order, until nothing is left, no answer
 * comes, or one is refused. To be run by one tab at a time. It may be broken off at any point: what
 * it had sent by then is sent again the next time, and each entry is made so that this does no harm.
 */
export async function sendAll(personId: string, ports: SendPorts): Promise<void> {
  const { storage, send, settled } = ports;
  for (;;) {
    const entry = nextOf(await storage.read(), personId);
    if (!entry) return;
    const outcome = await send(entry);
    const after = await storage.change((entries) => afterSending(entries, entry, outcome));
    settled(entry, outcome, after);
    if (outcome.kind === 'lost' || outcome.kind === 'later') return;
  }
}
