import { useQueryClient } from '@tanstack/react-query';
import { boardQuery } from './board.ts';

/** After any change, done or failed, the board is read anew: verdicts hang on everything. */
export function useBoardChanged(slug: string) {
  const client = useQueryClient();
  return {
    onSettled: () => client.invalidateQueries({ queryKey: boardQuery(slug).queryKey }),
  };
}
