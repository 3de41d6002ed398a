import type { Batch } from '#shared/api/batch.ts';
import type { JudgedLink } from '#shared/chain/judgeBoard.ts';
import type { linkInput } from '#shared/chain/linkInput.ts';

/** What a brew sheet is made from: one link, judged, with what it was judged by. */
export interface SheetOf {
  earlier: Batch;
  later: Batch;
  link: JudgedLink;
  input: NonNullable<ReturnType<typeof linkInput>>;
}
