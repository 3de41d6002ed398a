import { queryOptions, useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { useMemo } from 'react';
import { z } from 'zod';
import { cakeCheck, type CakeCheckWrite } from '#shared/api/cakeCheck.ts';
import {
  batchEvent,
  batchNote,
  batchRecord,
  instrument,
  reading,
  type BatchRecord,
  type EventCreate,
  type EventWrite,
  type InstrumentCreate,
  type InstrumentPatch,
  type NoteCreate,
  type ReadingCreate,
  type ReadingWrite,
} from '#shared/api/reading.ts';
import type { Person } from '#shared/api/people.ts';
import { api } from '#shared/api/urls.ts';
import { EVENT_WORDS, JUDGED_WORDS } from '#shared/record/readings.ts';
import { newId } from '../app/newId.ts';
import { KEPT } from '../kept/meta.ts';
import { asTyped } from '../outbox/asTyped.ts';
import { outbox } from '../outbox/outbox.ts';
import type { Entries } from '../outbox/queue.ts';
import { useOutbox } from '../outbox/useOutbox.ts';
import { boardQuery } from './board.ts';
import { request } from './client.ts';
import { useKeptForBatch } from './keepForBatch.ts';
import { withRecordWaiting } from './recordWaiting.ts';
import { useSession } from './session.ts';
import { useReadAnew } from './useReadAnew.ts';

/** All that was written down of one batch. The only owner of its key. */
export const batchRecordQuery = (slug: string, batchId: string) =>
  queryOptions({
    queryKey: ['batch-record', slug, batchId] as const,
    queryFn: ({ signal }) =>
      request(batchRecord, 'GET', api.batchRecord(slug, batchId), { signal }),
    ...KEPT,
  });

/** The record with what still waits to be sent laid over it; a change raises the board's revision too. */
export function useBatchRecord(slug: string, batchId: string, revision: number) {
  const query = batchRecordQuery(slug, batchId);
  useReadAnew(query.queryKey, revision);
  const { data, error, refetch } = useQuery(query);
  const entries = useOutbox();
  const me = useSession().data;
  const shown = useMemo(
    () => (data && me ? shownRecord(data, entries, me, { slug, batchId }) : data),
    [data, entries, me, slug, batchId],
  );
  return { data: shown, error, refetch };
}

const shownRecord = (
  record: BatchRecord,
  entries: Entries,
  { id, name }: Person,
  where: { slug: string; batchId: string },
): BatchRecord => withRecordWaiting(record, entries, { ...where, me: { personId: id, name } });

/**
 * The record as the page shows it at the moment of asking: what is written on top of a row is made
 * from the row with what waits in it, or from what somebody else has made of it by then.
 */
export function useRecordNow(slug: string, batchId: string): () => BatchRecord | undefined {
  const client = useQueryClient();
  const me = useSession().data;
  return () => {
    const record = client.getQueryData(batchRecordQuery(slug, batchId).queryKey);
    return record && me ? shownRecord(record, outbox.get(), me, { slug, batchId }) : record;
  };
}

/** The record is read anew, and the board: its verdicts hang on the readings. */
function useReadAll(slug: string, batchId: string) {
  const client = useQueryClient();
  return () =>
    Promise.all([
      client.invalidateQueries({ queryKey: batchRecordQuery(slug, batchId).queryKey }),
      client.invalidateQueries({ queryKey: boardQuery(slug).queryKey }),
    ]);
}

/** What is taken is laid in by the outbox; what is refused may be so for what is not known here yet. */
const useRecordChanged = (slug: string, batchId: string) => ({
  onError: useReadAll(slug, batchId),
});

interface Which {
  id: string;
  version: number;
}

/** A change of a row, from the version that it was made from. */
const changeOf = (
  method: 'PUT' | 'DELETE',
  url: string,
  ifMatch: number,
  what: (name: string) => string,
  body?: unknown,
) => ({ id: newId(), method, url, ifMatch, what, ...(body !== undefined && { body }) });

const UNIT_OF = { gravity: '', temperature: ' °C', ph: '' } as const;
/** As it was typed, else as the instrument shows it. */
const shownWords = ({ kind, shown, typed }: ReadingWrite): string =>
  `${kind === 'ph' ? 'pH' : kind} ${asTyped(typed.shown) ?? `${shown}${UNIT_OF[kind]}`}`;

const short = (text: string) => (text.length > 40 ? `${text.slice(0, 40)}…` : text);

export function useReadings(slug: string, batchId: string) {
  const changed = useRecordChanged(slug, batchId);
  const keep = useKeptForBatch(slug, batchId);
  const at = (id: string) => api.reading(slug, batchId, id);
  return {
    add: useMutation({
      mutationFn: (body: ReadingCreate) => {
        const what = (name: string) => `${name}: ${shownWords(body)}`;
        const { id } = body;
        return keep({ id, method: 'POST', url: api.readings(slug, batchId), body, what }, reading);
      },
      ...changed,
    }),
    edit: useMutation({
      mutationFn: ({ id, version, body }: Which & { body: ReadingWrite }) => {
        const what = (name: string) => `${name}: a reading changed to ${shownWords(body)}`;
        return keep(changeOf('PUT', at(id), version, what, body), reading);
      },
      ...changed,
    }),
    remove: useMutation({
      mutationFn: ({ id, version }: Which) =>
        keep(
          changeOf('DELETE', at(id), version, (name) => `${name}: a reading deleted`),
          z.unknown(),
        ),
      ...changed,
    }),
  };
}

export function useNotes(slug: string, batchId: string) {
  const changed = useRecordChanged(slug, batchId);
  const keep = useKeptForBatch(slug, batchId);
  const at = (id: string) => api.note(slug, batchId, id);
  return {
    add: useMutation({
      mutationFn: (body: NoteCreate) => {
        const what = (name: string) => `${name}: note “${short(body.text)}”`;
        const { id } = body;
        return keep({ id, method: 'POST', url: api.notes(slug, batchId), body, what }, batchNote);
      },
      ...changed,
    }),
    edit: useMutation({
      mutationFn: ({ id, version, text }: Which & { text: string }) => {
        const what = (name: string) => `${name}: note changed to “${short(text)}”`;
        return keep(changeOf('PUT', at(id), version, what, { text }), batchNote);
      },
      ...changed,
    }),
    remove: useMutation({
      mutationFn: ({ id, version }: Which) =>
        keep(
          changeOf('DELETE', at(id), version, (name) => `${name}: a note deleted`),
          z.unknown(),
        ),
      ...changed,
    }),
  };
}

export function useEvents(slug: string, batchId: string) {
  const changed = useRecordChanged(slug, batchId);
  const keep = useKeptForBatch(slug, batchId);
  const at = (id: string) => api.event(slug, batchId, id);
  return {
    add: useMutation({
      mutationFn: (body: EventCreate) => {
        const what = (name: string) => `${name}: ${EVENT_WORDS[body.kind]}`;
        const { id } = body;
        return keep({ id, method: 'POST', url: api.events(slug, batchId), body, what }, batchEvent);
      },
      ...changed,
    }),
    edit: useMutation({
      mutationFn: ({ id, version, body }: Which & { body: EventWrite }) => {
        const what = (name: string) => `${name}: ${EVENT_WORDS[body.kind]} changed`;
        return keep(changeOf('PUT', at(id), version, what, body), batchEvent);
      },
      ...changed,
    }),
    remove: useMutation({
      mutationFn: ({ id, version }: Which) =>
        keep(
          changeOf('DELETE', at(id), version, (name) => `${name}: something done, deleted`),
          z.unknown(),
        ),
      ...changed,
    }),
  };
}

export function useInstruments(slug: string, batchId: string) {
  const changed = { onSettled: useReadAll(slug, batchId) };
  return {
    add: useMutation({
      mutationFn: (body: InstrumentCreate) =>
        request(instrument, 'POST', api.instruments(slug), { body }),
      ...changed,
    }),
    edit: useMutation({
      mutationFn: ({ id, version, patch }: Which & { patch: InstrumentPatch }) =>
        request(instrument, 'PATCH', api.instrument(slug, id), { body: patch, ifMatch: version }),
      ...changed,
    }),
  };
}

export function useCakeCheck(slug: string, batchId: string) {
  const changed = useRecordChanged(slug, batchId);
  const keep = useKeptForBatch(slug, batchId);
  const path = api.cakeCheck(slug, batchId);
  return {
    /** Version 0: nobody has judged it yet. */
    sign: useMutation({
      mutationFn: ({ version, body }: { version: number; body: CakeCheckWrite }) => {
        const what = (name: string) => `Cake of ${name} judged ${JUDGED_WORDS[body.judged]}`;
        return keep(changeOf('PUT', path, version, what, body), cakeCheck);
      },
      ...changed,
    }),
    withdraw: useMutation({
      mutationFn: (version: number) =>
        keep(
          changeOf('DELETE', path, version, (name) => `Cake check of ${name} taken back`),
          z.unknown(),
        ),
      ...changed,
    }),
  };
}
