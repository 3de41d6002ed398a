import { useQueryClient, type QueryKey } from '@tanstack/react-query';
import { useEffect, useRef } from 'react';

/** Reads a query anew whenever anything on the board changed: every change raises its revision. */
export function useReadAnew(queryKey: QueryKey, revision: number) {
  const client = useQueryClient();
  const known = useRef(revision);
  useEffect(() => {
    if (known.current === revision) return;
    known.current = revision;
    void client.invalidateQueries({ queryKey });
  }, [client, queryKey, revision]);
}
