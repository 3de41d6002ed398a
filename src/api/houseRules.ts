import { queryOptions, useMutation, useQueryClient, useSuspenseQuery } from '@tanstack/react-query';
import { useEffect } from 'react';
import type { HouseRuleChanges } from '#shared/api/board.ts';
import { houseRules, type HouseRulesRow } from '#shared/api/houseRules.ts';
import { api } from '#shared/api/urls.ts';
import { useBoard } from './board.ts';
import { useBoardChanged } from './boardChanged.ts';
import { request } from './client.ts';

const houseRulesQuery = (slug: string) =>
  queryOptions({
    queryKey: ['house-rules', slug] as const,
    queryFn: ({ signal }) => request(houseRules, 'GET', api.houseRules(slug), { signal }),
  });

/** The house rules with their history, read anew when anything on the board changes. */
export function useHouseRules(slug: string): HouseRulesRow {
  const client = useQueryClient();
  const { revision } = useBoard().season;
  const { queryKey } = houseRulesQuery(slug);
  const [, of] = queryKey;
  useEffect(() => {
    void client.invalidateQueries({ queryKey: houseRulesQuery(of).queryKey });
  }, [client, of, revision]);
  return useSuspenseQuery(houseRulesQuery(slug)).data;
}

export function useHouseRulesPut(slug: string) {
  const client = useQueryClient();
  const { onSettled } = useBoardChanged(slug);
  return useMutation({
    mutationFn: ({ version, changes }: { version: number; changes: HouseRuleChanges }) =>
      request(houseRules, 'PUT', api.houseRules(slug), { body: changes, ifMatch: version }),
    onSuccess: (row) => client.setQueryData(houseRulesQuery(slug).queryKey, row),
    onSettled,
  });
}
