import { queryOptions, useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { useMemo } from 'react';
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
import { newId } from '../app/newId.ts';
import { KEPT } from '../kept/meta.ts';
import { asTyped } from '../outbox/asTyped.ts';
import { queueOrSend } from '../outbox/queueOrSend.ts';
import { useOutbox } from '../outbox/useOutbox.ts';
import { boardQuery } from './board.ts';
import { request } from './client.ts';
import { ofPour, withWaiting } from './pourWaiting.ts';
import { serverClock } from './serverClock.ts';
import { useSession } from './session.ts';
import { todayQuery } from './today.ts';
import { useReadAnew } from './useReadAnew.ts';

/** The newest pour run of a batch. The only owner of its key. */
export const pourQuery = (slug: string, batchId: string) =>
  queryOptions({
    queryKey: ['pour', slug, batchId] as const,
    queryFn: ({ signal }) =>
      serverClock.measured(() => request(pourState, 'GET', api.pour(slug, batchId), { signal })),
    ...KEPT,
  });

/** The run with what still waits to be sent laid over it; each command raises the board's revision. */
export function usePour(
  slug: string,
  batchId: string,
  revision: number,
  cakeBatchId: string | null,
) {
  const query = pourQuery(slug, batchId);
  useReadAnew(query.queryKey, revision);
  const { data, error } = useQuery(query);
  const entries = useOutbox();
  const me = useSession().data;
  const isWaiting = ofPour(entries, { slug, batchId }).length > 0;
  const shown = useMemo(() => {
    if (!me || !isWaiting) return data;
    const by = { personId: me.id, name: me.name };
    // What was begun here without a connection has no answer to stand on yet.
    const state = data ?? { run: null, now: new Date(serverClock.now()).toISOString() };
    return withWaiting(state, entries, { slug, batchId, cakeBatchId, me: by });
  }, [data, entries, me, isWaiting, slug, batchId, cakeBatchId]);
  return { data: shown, error, isWaiting };
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

/** What somebody does at the vessel: it is kept where there is no connection. Others are asked of people. */
const KEEPS: ReadonlySet<PourCommand['kind']> = new Set([
  'open',
  'step',
  'read',
  'withdraw',
  'pour',
  'leave',
]);

/** What a command is called while it waits. */
function wordsOf(command: PourCommand, name: string): string {
  switch (command.kind) {
    case 'open':
      return `Pour of ${name}: begun`;
    case 'step':
      return `Pour of ${name}: ${STEPS[command.body.step]}`;
    case 'read':
      return `Pour of ${name}: wort at ${asTyped(command.body.typed.c) ?? `${command.body.c} °C`}`;
    case 'withdraw':
      return `Pour of ${name}: a reading taken back`;
    case 'pour':
      return `${name} poured`;
    default:
      return `Pour of ${name}: left`;
  }
}

const STEPS: Record<PourStepRequest['step'], string> = {
  racked: 'the beer before it',
  cake: 'the cake check',
  keep: 'how much is kept',
  clean: 'cleaning',
  wort: 'the wort',
  after: 'air and lid',
};

/** Sends a command, or keeps it; its answer is the run as it stands then. */
export function usePourCommand(slug: string, batchId: string) {
  const client = useQueryClient();
  const { queryKey } = pourQuery(slug, batchId);
  return useMutation({
    mutationFn: async (command: PourCommand): Promise<PourState | null> => {
      const { kind, body } = command;
      const url = URLS[kind](slug, batchId);
      if (!KEEPS.has(kind))
        return serverClock.measured(() => request(pourState, 'POST', url, { body }));
      const board = client.getQueryData(boardQuery(slug).queryKey);
      const name = board?.batches.find(({ id }) => id === batchId)?.name ?? 'a batch';
      const sent = await queueOrSend(
        {
          id: 'id' in body ? body.id : newId(),
          method: 'POST',
          url,
          body,
          what: wordsOf(command, name),
          touches: [queryKey, boardQuery(slug).queryKey, todayQuery(slug).queryKey],
          answers: queryKey,
        },
        pourState,
      );
      return sent.kind === 'sent' ? sent.answer : null;
    },
    // What is kept is laid in by the outbox, once the server has taken it.
    onSuccess: (state: PourState | null, { kind }) => {
      if (KEEPS.has(kind) || !state) return undefined;
      client.setQueryData(queryKey, state);
      return client.invalidateQueries({ queryKey: boardQuery(slug).queryKey });
    },
    onError: () =>
      Promise.all([
        client.invalidateQueries({ queryKey: boardQuery(slug).queryKey }),
        client.invalidateQueries({ queryKey }),
      ]),
  });
}
