import { useMemo, useState } from 'react';
import type { Batch } from '#shared/api/batch.ts';
import { sightOf } from '#shared/chain/boardLink.ts';
import { checkLink } from '#shared/chain/checkLink.ts';
import { linkInput } from '#shared/chain/linkInput.ts';
import type { LinkAnswer } from '#shared/rules/answer.ts';
import { useBoardView } from '../view/BoardView.tsx';

/** The kept part: litres, the recommended part, or all of it. */
export type Kept = number | 'recommended' | 'whole';

export interface LinkDraft {
  earlier: Batch;
  later: Batch;
  /** Judged with the part that is being tried. */
  answer: LinkAnswer;
  accepted: boolean;
  kept: Kept;
  /** True while a part is tried that is not stored. */
  isTrying: boolean;
  tryKept(kept: Kept | null): void;
}

export const storedKept = ({ link }: Batch): Kept =>
  link.keepWhole ? 'whole' : (link.keepL ?? 'recommended');

/** A link with the part of the cake that is tried on it; nothing is stored here. */
export function useLinkDraft(laterId: string, earlierId: string): LinkDraft | null {
  const { board, index, judged, units } = useBoardView();
  const [tried, setTried] = useState<Kept | null>(null);
  const input = useMemo(() => linkInput(laterId, sightOf(board, units)), [board, units, laterId]);
  const stored = judged.links.get(laterId);
  const answer = useMemo(() => {
    if (tried === null || !input) return stored;
    const { keepL: _, ...pour } = input.pour;
    return checkLink({
      ...input,
      pour: tried === 'whole' ? pour : { ...pour, keepL: tried },
    });
  }, [tried, input, stored]);
  const earlier = index.batch(earlierId);
  const later = index.batch(laterId);
  if (!earlier || !later || !answer) return null;
  return {
    earlier,
    later,
    answer,
    accepted: stored?.accepted ?? false,
    kept: tried ?? storedKept(later),
    isTrying: tried !== null && tried !== storedKept(later),
    tryKept: setTried,
  };
}
