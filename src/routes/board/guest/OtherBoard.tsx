import type { ReactNode } from 'react';
import { OtherBoardSlug } from '../../../api/board.ts';
import { BoardViewProvider } from '../view/BoardView.tsx';

/** What is drawn inside is of another brewery's board, and what is changed goes to that brewery. */
export function OtherBoard({ slug, children }: { slug: string; children: ReactNode }) {
  return (
    <OtherBoardSlug value={slug}>
      <BoardViewProvider>{children}</BoardViewProvider>
    </OtherBoardSlug>
  );
}
