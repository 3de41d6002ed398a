import type { QueryClient } from '@tanstack/react-query';
import { isProblem, OfflineError } from '../api/errors.ts';

/** No answer, or a database that was restarting: the same request may succeed in a moment. */
const isPassing = (error: unknown) => error instanceof OfflineError || isProblem(error, 'busy');

/**
 * At each heartbeat: what is shown beside the board and could not be read anew, such as a talk, is
 * read again. Nothing else would ask before the next change of the season. Boards are caught up with
 * by their revision.
 */
export function readFailedAgain(client: QueryClient): void {
  void client.refetchQueries({
    type: 'active',
    predicate: ({ queryKey, state }) =>
      state.status === 'error' && isPassing(state.error) && queryKey[0] !== 'board',
  });
}
