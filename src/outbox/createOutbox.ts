import type { Entry, Outcome } from './entry.ts';
import { ofPerson, tryAgain, withNew, without, type Entries } from './queue.ts';
import { sendAll, type OutboxStorage } from './sendAll.ts';

export interface OutboxPorts {
  storage: OutboxStorage;
  send(entry: Entry): Promise<Outcome>;
  /** Who is signed in here; null: nobody, or not known yet. */
  person(): string | null;
  /** Runs one sender at a time among all tabs of the browser. */
  alone(work: () => Promise<void>): Promise<void>;
  /** The server took an entry: what it changed is put in place, or read anew. */
  taken(entry: Entry, answer: unknown): void;
  /** Whether there seems to be a connection. */
  isHopeful(): boolean;
  /** How long somebody is kept waiting for an answer: with wet hands, not long. */
  patience(): Promise<void>;
  /** Tells the other tabs that the entries changed. */
  tell(): void;
}

/** What became of an entry by the time its writer was told. */
export type Fate =
  { kind: 'sent'; answer: unknown } | { kind: 'waiting' } | { kind: 'refused'; entry: Entry };

/** Entries of this device, sent in order; pages see those of the person who is signed in. */
export function createOutbox(ports: OutboxPorts) {
  const { storage } = ports;
  const listeners = new Set<() => void>();
  let known: Entries = [];
  let seen: { of: Entries; by: string | null; list: Entries } | null = null;

  const show = (entries: Entries) => {
    known = entries;
    for (const listener of listeners) listener();
  };
  const change = async (how: (entries: Entries) => Entries) => {
    show(await storage.change(how));
    ports.tell();
  };
  const outcomes = new Map<string, Outcome>();

  const flush = () =>
    ports.alone(async () => {
      const personId = ports.person();
      if (personId === null) return;
      await sendAll(personId, {
        storage,
        send: ports.send,
        settled: (entry, outcome, after) => {
          outcomes.set(entry.id, outcome);
          // Its answer stands in its place before it goes: nothing vanishes for a moment.
          if (!after.some(({ id }) => id === entry.id))
            ports.taken(entry, outcome.kind === 'done' ? outcome.answer : undefined);
          show(after);
          ports.tell();
        },
      });
    });

  return {
    /** Entries of whoever is signed in, oldest first. The same list for as long as nothing changes. */
    get(): Entries {
      const by = ports.person();
      if (seen?.of !== known || seen.by !== by) seen = { of: known, by, list: ofPerson(known, by) };
      return seen.list;
    },
    subscribe(listener: () => void) {
      listeners.add(listener);
      return () => void listeners.delete(listener);
    },
    /** Another tab wrote or sent something, or the page has just begun. */
    look: async () => show(await storage.read()),
    flush,
    /** Stores an entry, then tries to send it with all before it. */
    async add(entry: Entry): Promise<Fate> {
      await change((entries) => withNew(entries, entry));
      if (ports.isHopeful()) await Promise.race([flush(), ports.patience()]);
      const outcome = outcomes.get(entry.id);
      outcomes.delete(entry.id);
      // Another tab may have sent it in the meantime, or been refused.
      if (!outcome) show(await storage.read());
      const left = known.find(({ id }) => id === entry.id);
      if (left?.refusal) return { kind: 'refused', entry: left };
      if (left) return { kind: 'waiting' };
      // The other tab has the answer: this one's pages still lack what it changed.
      if (!outcome) ports.taken(entry, undefined);
      return { kind: 'sent', answer: outcome?.kind === 'done' ? outcome.answer : undefined };
    },
    discard: async (id: string) => {
      await change((entries) => without(entries, id));
      await flush();
    },
    retry: async (id: string, from: Parameters<typeof tryAgain>[2]) => {
      await change((entries) => tryAgain(entries, id, from));
      await flush();
    },
  };
}
