import { useMutation } from '@tanstack/react-query';
import { acceptanceRequest, batch, type LinkPatch, type StageRequest } from '#shared/api/batch.ts';
import { api } from '#shared/api/urls.ts';
import { useBoardChanged } from './boardChanged.ts';
import { request } from './client.ts';

interface OfBatch {
  id: string;
  version: number;
}

/** Facts of the link from the batch before; `id` is the later batch. */
export function useLinkPatch(slug: string) {
  return useMutation({
    mutationFn: ({ id, version, patch }: OfBatch & { patch: LinkPatch }) =>
      request(batch, 'PATCH', api.link(slug, id), { body: patch, ifMatch: version }),
    ...useBoardChanged(slug),
  });
}

/** Accepts a link's hold with a reason, or takes the acceptance back. */
export function useAcceptance(slug: string) {
  return useMutation({
    mutationFn: ({ id, version, reason }: OfBatch & { reason: string | null }) =>
      reason === null
        ? request(batch, 'DELETE', api.acceptance(slug, id), { ifMatch: version })
        : request(batch, 'PUT', api.acceptance(slug, id), {
            body: acceptanceRequest.parse({ reason }),
            ifMatch: version,
          }),
    ...useBoardChanged(slug),
  });
}

export function useStage(slug: string) {
  return useMutation({
    mutationFn: ({ id, version, change }: OfBatch & { change: StageRequest }) =>
      request(batch, 'POST', api.batchStage(slug, id), { body: change, ifMatch: version }),
    ...useBoardChanged(slug),
  });
}
