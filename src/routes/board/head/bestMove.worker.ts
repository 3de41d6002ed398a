import { bestMove } from '#shared/chain/bestMove.ts';
import type { BoardFacts } from '#shared/chain/board.ts';

/** Weighs every batch of a season against every place, beside the page and not in its way. */
addEventListener('message', ({ data }: MessageEvent<BoardFacts>) => {
  postMessage(bestMove(data));
});
