import type { Gap } from '#shared/chain/gaps.ts';
import { useLiftMachine } from './liftContext.ts';

/** Puts a batch into a judged place without lifting it first: buttons beside the board. */
export function usePut(): (batchId: string, gap: Gap) => void {
  const { putting } = useLiftMachine();
  return putting.put;
}
