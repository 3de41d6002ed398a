import { useQueryClient } from '@tanstack/react-query';
import type { z } from 'zod';
import { queueOrSend, type Command } from '../outbox/queueOrSend.ts';
import { boardQuery } from './board.ts';
import { todayQuery } from './today.ts';

type OfBatch = Omit<Command, 'touches' | 'what'> & {
  /** What it is, in words, given the name of the batch. */
  what: (name: string) => string;
};

/**
 * Sends something that was written about a batch, or keeps it until the connection is back. The
 * answer is null while it waits.
 */
export function useKeptForBatch(slug: string, batchId: string) {
  const client = useQueryClient();
  const board = boardQuery(slug).queryKey;
  return async <T>({ what, ...command }: OfBatch, answer: z.ZodType<T>): Promise<T | null> => {
    const batches = client.getQueryData(board)?.batches ?? [];
    const name = batches.find(({ id }) => id === batchId)?.name ?? 'a batch';
    const record = ['batch-record', slug, batchId];
    const touches = [record, board, todayQuery(slug).queryKey];
    const sent = await queueOrSend({ ...command, what: what(name), touches }, answer);
    return sent.kind === 'sent' ? sent.answer : null;
  };
}
