import { useMutation } from '@tanstack/react-query';
import { batch, type BatchCreate, type BatchPatch } from '#shared/api/batch.ts';
import { api } from '#shared/api/urls.ts';
import { request, requestNothing } from './client.ts';
import { useBoardChanged } from './boardChanged.ts';

export function useBatchCreate(slug: string) {
  return useMutation({
    mutationFn: (body: BatchCreate) => request(batch, 'POST', api.batches(slug), { body }),
    ...useBoardChanged(slug),
  });
}

export function useBatchPatch(slug: string) {
  return useMutation({
    mutationFn: ({ id, version, patch }: { id: string; version: number; patch: BatchPatch }) =>
      request(batch, 'PATCH', api.batch(slug, id), { body: patch, ifMatch: version }),
    ...useBoardChanged(slug),
  });
}

export function useBatchDelete(slug: string) {
  return useMutation({
    mutationFn: ({ id, version }: { id: string; version: number }) =>
      requestNothing('DELETE', api.batch(slug, id), { ifMatch: version }),
    ...useBoardChanged(slug),
  });
}
