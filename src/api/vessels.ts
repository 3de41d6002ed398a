import { useMutation } from '@tanstack/react-query';
import { vessel, type VesselCreate, type VesselPatch } from '#shared/api/vessel.ts';
import { api } from '#shared/api/urls.ts';
import { request, requestNothing } from './client.ts';
import { useBoardChanged } from './boardChanged.ts';

export function useVesselCreate(slug: string) {
  return useMutation({
    mutationFn: (body: VesselCreate) => request(vessel, 'POST', api.vessels(slug), { body }),
    ...useBoardChanged(slug),
  });
}

export function useVesselPatch(slug: string) {
  return useMutation({
    mutationFn: ({ id, version, patch }: { id: string; version: number; patch: VesselPatch }) =>
      request(vessel, 'PATCH', api.vessel(slug, id), { body: patch, ifMatch: version }),
    ...useBoardChanged(slug),
  });
}

export function useVesselDelete(slug: string) {
  return useMutation({
    mutationFn: ({ id, version }: { id: string; version: number }) =>
      requestNothing('DELETE', api.vessel(slug, id), { ifMatch: version }),
    ...useBoardChanged(slug),
  });
}
