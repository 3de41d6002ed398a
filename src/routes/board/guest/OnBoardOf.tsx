import { useQueries } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { placeOf } from '#shared/api/urls.ts';
import { boardQuery, useBoard } from '../../../api/board.ts';
import { OtherBoard } from './OtherBoard.tsx';

/** What is told of a batch, on the board on which it stands: the brewery's own, or one that somebody is a guest of. */
export function OnBoardOf({ batchId, children }: { batchId: string; children: ReactNode }) {
  const { guests } = useBoard();
  const slugs = [...new Set(guests.map(({ ownerSlug, seasonId }) => placeOf(ownerSlug, seasonId)))];
  const others = useQueries({ queries: slugs.map((slug) => boardQuery(slug)) });
  const at = others.findIndex(({ data }) => data?.batches.some(({ id }) => id === batchId));
  const slug = slugs[at];
  return slug === undefined ? children : <OtherBoard slug={slug}>{children}</OtherBoard>;
}
