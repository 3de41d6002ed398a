import { queryOptions, useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { useEffect, useRef } from 'react';
import {
  pourState,
  type OverrideAnswer,
  type OverrideRequest,
  type PourRequest,
  type PourState,
  type PourStepRequest,
  type WortReadingRequest,
} from '#shared/api/pour.ts';
import { api } from '#shared/api/urls.ts';
import { boardQuery } from './board.ts';
import { request } from './client.ts';
import { serverClock } from './serverClock.ts';

/** The newest pour run of a batch. The only owner of its key. */
export const pourQuery = (slug: string, batchId: string) =>
  queryOptions({
    queryKey: ['pour', slug, batchId] as const,
    queryFn: ({ signal }) =>
      serverClock.measured(() => request(pourState, 'GET', api.pour(slug, batchId), { signal })),
  });

/** The run, read anew whenever anything on the board changed: each of its commands raises the revision. */
export function usePour(slug: string, batchId: string, revision: number) {
  const client = useQueryClient();
  const known = useRef(revision);
  useEffect(() => {
    if (known.current === revision) return;
    known.current = revision;
    void client.invalidateQueries({ queryKey: pourQuery(slug, batchId).queryKey });
  }, [client, slug, batchId, revision]);
  return useQuery(pourQuery(slug, batchId));
}

/** Everything that can be done with a run. Each is named, so that it can wait for a connection. */
export type PourCommand =
  | { kind: 'open'; body: { id: string } }
  | { kind: 'step'; body: PourStepRequest }
  | { kind: 'read'; body: WortReadingRequest }
  | { kind: 'withdraw'; body: { runId: string; readingId: string } }
  | { kind: 'ask'; body: OverrideRequest }
  | { kind: 'answer'; body: OverrideAnswer }
  | { kind: 'pour'; body: PourRequest }
  | { kind: 'sign'; body: { runId: string; reason: string } }
  | { kind: 'take-over'; body: { runId: string } }
  | { kind: 'leave'; body: { runId: string } };

const URLS: Record<PourCommand['kind'], (slug: string, batchId: string) => string> = {
  open: api.pour,
  step: api.pourStep,
  read: api.pourReadings,
  withdraw: api.pourWithdrawals,
  ask: api.pourOverrides,
  answer: api.pourAnswers,
  pour: api.pourDone,
  sign: api.pourSignature,
  'take-over': api.pourHolder,
  leave: api.pourLeaving,
};

/** Sends a command; its answer is the run as it stands then. */
export function usePourCommand(slug: string, batchId: string) {
  const client = useQueryClient();
  const { queryKey } = pourQuery(slug, batchId);
  return useMutation({
    mutationFn: ({ kind, body }: PourCommand) =>
      serverClock.measured(() => request(pourState, 'POST', URLS[kind](slug, batchId), { body })),
    onSuccess: (state: PourState) => client.setQueryData(queryKey, state),
    onSettled: (_state, error) =>
      Promise.all([
        client.invalidateQueries({ queryKey: boardQuery(slug).queryKey }),
        error ? client.invalidateQueries({ queryKey }) : undefined,
      ]),
  });
}
