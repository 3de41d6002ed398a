import { useState } from 'react';
import { useLocation } from 'react-router-dom';
import { useBoardView } from '../view/BoardView.tsx';
import { useSought } from './useArrival.ts';

/**
 * The shelf (or the bench) of what was just looked for, once each time it is; else null. On a phone
 * one shelf is shown at a time.
 */
export function useSoughtShelf(): string | null {
  const { index } = useBoardView();
  const sought = useSought();
  const { key } = useLocation();
  const [seen, setSeen] = useState<string | null>(null);
  if (sought === null || seen === key) return null;
  setSeen(key);
  if (index.chain(sought)) return sought;
  const batch = index.batch(sought);
  return batch ? (batch.chainId ?? 'bench') : null;
}
