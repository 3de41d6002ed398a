import { useMutation, useQueryClient } from '@tanstack/react-query';
import type { BreweryCreate } from '#shared/api/membership.ts';
import { joined } from '#shared/api/people.ts';
import { api } from '#shared/api/urls.ts';
import { request } from './client.ts';
import { sessionQuery } from './session.ts';

export function useMakeBrewery() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: BreweryCreate) => request(joined, 'POST', api.breweries, { body }),
    onSuccess: ({ person }) => client.setQueryData(sessionQuery.queryKey, person),
  });
}
