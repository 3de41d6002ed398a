import { createContext, use, useMemo, type ReactNode } from 'react';
import { useSearchParams } from 'react-router-dom';
import { useBoardView } from '../view/BoardView.tsx';
import { filterOf, matching } from './filter.ts';

/** Ids of the batches that the filter of the address lets through; null: there is no filter. */
const Matching = createContext<ReadonlySet<string> | null>(null);

/** Worked out once for the board. What is drawn of a batch asks only whether it is passed over. */
export function MatchingProvider({ children }: { children: ReactNode }) {
  const { index, judged } = useBoardView();
  const [params] = useSearchParams();
  const asked = params.toString();
  const matches = useMemo(
    () => matching(filterOf(new URLSearchParams(asked)), { index, judged }),
    [asked, index, judged],
  );
  return <Matching value={matches}>{children}</Matching>;
}

export const useMatching = () => use(Matching);

/** True of a batch that the filter passes over: it is drawn pale, and works as ever. */
export function useIsPale(batchId: string): boolean {
  const matches = use(Matching);
  return matches !== null && !matches.has(batchId);
}
