import type { z } from 'zod';
import { CONTRACT } from '#shared/api/contract.ts';
import { queryClient } from '../api/queryClient.ts';
import { sessionQuery } from '../api/session.ts';
import type { Entry } from './entry.ts';
import { outbox } from './outbox.ts';
import { problemFrom } from './sendEntry.ts';

export interface Command extends Pick<Entry, 'id' | 'method' | 'url' | 'what' | 'touches'> {
  body?: unknown;
  ifMatch?: number;
  answers?: Entry['answers'];
  /** Where to look at it again; left out: the page that one is on. */
  page?: string;
}

/** Null in `answer`: it was sent, but another tab has the answer. */
export type Sent<T> = { kind: 'sent'; answer: T | null } | { kind: 'waiting' };

/**
 * Sends a command, or keeps it until the connection is back. It is on the device before it is sent,
 * so that neither a lost answer nor a closed page loses it. What the server refuses at once is
 * thrown as a `ProblemError`, as if it had been sent plainly: the form still has what was typed.
 */
export async function queueOrSend<T>(command: Command, answer: z.ZodType<T>): Promise<Sent<T>> {
  const personId = queryClient.getQueryData(sessionQuery.queryKey)?.id;
  if (personId === undefined) throw new Error('Somebody is signed in wherever there is a form');
  const fate = await outbox.add({
    page: location.pathname,
    ...command,
    personId,
    contract: CONTRACT,
    madeAt: new Date().toISOString(),
    refusal: null,
  });
  switch (fate.kind) {
    case 'waiting':
      return fate;
    case 'sent': {
      const parsed = answer.safeParse(fate.answer);
      return { kind: 'sent', answer: parsed.success ? parsed.data : null };
    }
    case 'refused': {
      await outbox.discard(fate.entry.id);
      throw problemFrom(fate.entry) ?? new Error('It was refused');
    }
  }
}
