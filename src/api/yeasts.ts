import { useMutation } from '@tanstack/react-query';
import { yeast, type YeastCreate, type YeastPatch } from '#shared/api/yeast.ts';
import { api } from '#shared/api/urls.ts';
import { request, requestNothing } from './client.ts';
import { useBoardChanged } from './boardChanged.ts';

export function useYeastCreate(slug: string) {
  return useMutation({
    mutationFn: (body: YeastCreate) => request(yeast, 'POST', api.yeasts(slug), { body }),
    ...useBoardChanged(slug),
  });
}

export function useYeastPatch(slug: string) {
  return useMutation({
    mutationFn: ({ id, version, patch }: { id: string; version: number; patch: YeastPatch }) =>
      request(yeast, 'PATCH', api.yeast(slug, id), { body: patch, ifMatch: version }),
    ...useBoardChanged(slug),
  });
}

export function useYeastDelete(slug: string) {
  return useMutation({
    mutationFn: ({ id, version }: { id: string; version: number }) =>
      requestNothing('DELETE', api.yeast(slug, id), { ifMatch: version }),
    ...useBoardChanged(slug),
  });
}
