import { useMutation, useQueryClient } from '@tanstack/react-query';
import { person, type AccountPatch } from '#shared/api/people.ts';
import { api } from '#shared/api/urls.ts';
import { request } from './client.ts';
import { sessionQuery } from './session.ts';

export function useAccountPatch() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ version, patch }: { version: number; patch: AccountPatch }) =>
      request(person, 'PATCH', api.account, { body: patch, ifMatch: version }),
    onSuccess: (who) => {
      client.setQueryData(sessionQuery.queryKey, who);
      // The name stands among the members of every board.
      void client.invalidateQueries({ queryKey: ['board'] });
    },
  });
}
