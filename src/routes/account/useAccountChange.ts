import { useMutation, useQueryClient } from '@tanstack/react-query';
import { person, type AccountPatch, type Person } from '#shared/api/people.ts';
import { useAccountPatch } from '../../api/account.ts';
import { isProblem } from '../../api/errors.ts';
import { sessionQuery } from '../../api/session.ts';

/**
 * Changes one's own account, one change after the other. It has one owner, so a change made
 * meanwhile in another window is no quarrel: this one is made on top of it.
 */
export function useAccountChange(me: Person) {
  const client = useQueryClient();
  const patch = useAccountPatch();
  return useMutation({
    scope: { id: 'account' },
    mutationFn: async (change: AccountPatch) => {
      const { version } = client.getQueryData(sessionQuery.queryKey) ?? me;
      try {
        return await patch.mutateAsync({ version, patch: change });
      } catch (error) {
        const now = isProblem(error, 'changed-since')
          ? person.safeParse(error.problem.current)
          : null;
        if (!now?.success) throw error;
        return patch.mutateAsync({ version: now.data.version, patch: change });
      }
    },
  });
}
