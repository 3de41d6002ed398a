import type { Batch } from '../api/batch.ts';
import { isPencilled, type BoardFacts, type BoardIndex } from './board.ts';
import { compareGaps, weigherOf, type Gap } from './gaps.ts';
import { JudgedGap } from './judgedGap.ts';
import { placesFor, type Place } from './gapPlaces.ts';
import { chainsThatCanHelp } from './reachOfMoves.ts';
import type { Judgement } from './trial/judgement.ts';
import { Scales, type ChangedLink } from './weigh.ts';

/** Links of the season by their verdict. */
export interface Tally {
  holds: number;
  minds: number;
}

export interface BestMove {
  batchId: string;
  gap: Gap;
  before: Tally;
  after: Tally;
  what: string;
}

/**
 * The single relocation that would help the season most: the largest fall of held links, then of
 * minded ones; among equals the fewest findings, no new shelf, then the best gap. Null where no
 * move lowers them. The bench is no answer: it only puts the beer away.
 */
export function bestMove(board: BoardFacts): BestMove | null {
  const steps = bestMoveSteps(board);
  for (;;) {
    const step = steps.next();
    if (step.done) return step.value;
  }
}

/** Places weighed in one step: two or three milliseconds. */
const PLACES_A_STEP = 60;

/**
 * The same in short steps, one for reading the board and the others for some places of one batch,
 * for a page that has only moments to spare. The board must not change meanwhile.
 */
export function* bestMoveSteps(board: BoardFacts): Generator<void, BestMove | null, void> {
  const scales = new Scales(board);
  const { index } = scales.sight;
  const before = seasonOf(scales);
  if (before.holds + before.minds === 0) return null;
  const helpful = chainsThatCanHelp(
    index,
    (id) => (scales.standing(id)?.verdict ?? 'pour') !== 'pour',
  );
  let best: Option | null = null;
  for (const batch of index.board.batches.filter(isPencilled)) {
    const option = yield* bestOf(scales, batch, helpful);
    if (option && (best === null || isBetter(option, best))) best = option;
  }
  return best && told(index, before, best);
}

/** [held links, minded links, hold findings, mind findings] that go. */
type Fall = readonly [number, number, number, number];

interface Option {
  batchId: string;
  gap: Gap;
  fall: Fall;
}

/** The place where one batch would help most; null where it helps nowhere. */
function* bestOf(
  scales: Scales,
  batch: Batch,
  helpful: ReadonlySet<string>,
): Generator<void, Option | null, void> {
  const weigh = weigherOf(scales, batch);
  let best: Option | null = null;
  for (const [count, place] of placesThatCanHelp(scales.sight.index, batch, helpful).entries()) {
    if (count % PLACES_A_STEP === 0) yield;
    const weighed = weigh(place);
    const fall = fallOf(weighed.changed);
    if (!helps(fall)) continue;
    const option = { batchId: batch.id, gap: new JudgedGap(weighed), fall };
    if (best === null || isBetter(option, best)) best = option;
    else if (!isBetter(best, option) && compareGaps(option.gap, best.gap) < 0) best = option;
  }
  scales.forget();
  return best;
}

function placesThatCanHelp(index: BoardIndex, batch: Batch, helpful: ReadonlySet<string>): Place[] {
  const fromHelpful =
    (batch.chainId !== null && helpful.has(batch.chainId)) ||
    index.branchesOf(batch.id).some((branch) => helpful.has(branch.id));
  return placesFor(index, batch).filter(
    ({ here, locked, toChainId }) =>
      !here && !locked && toChainId !== 'bench' && (fromHelpful || helpful.has(toChainId)),
  );
}

function fallOf(changed: readonly ChangedLink[]): Fall {
  const fall: [number, number, number, number] = [0, 0, 0, 0];
  for (const { before, after } of changed) {
    if (before) addTo(fall, before, 1);
    if (after) addTo(fall, after, -1);
  }
  return fall;
}

function addTo(fall: [number, number, number, number], link: Judgement, sign: 1 | -1): void {
  if (link.verdict === 'hold') fall[0] += sign;
  if (link.verdict === 'mind') fall[1] += sign;
  fall[2] += sign * link.holds;
  fall[3] += sign * link.minds;
}

const helps = ([holds, minds]: Fall): boolean => holds > 0 || (holds === 0 && minds > 0);

function isBetter(option: Option, than: Option): boolean {
  const isNew = ({ gap }: Option) => Number(gap.key === 'new');
  const difference =
    option.fall[0] - than.fall[0] ||
    option.fall[1] - than.fall[1] ||
    option.fall[2] - than.fall[2] ||
    option.fall[3] - than.fall[3] ||
    isNew(than) - isNew(option);
  return difference > 0;
}

function seasonOf(scales: Scales): Tally {
  const tally = { holds: 0, minds: 0 };
  const { index } = scales.sight;
  for (const chain of index.chains)
    for (const { id } of index.batchesOf(chain.id)) {
      const verdict = scales.standing(id)?.verdict;
      if (verdict === 'hold') tally.holds += 1;
      if (verdict === 'mind') tally.minds += 1;
    }
  return tally;
}

function told(index: BoardIndex, before: Tally, { batchId, gap, fall }: Option): BestMove {
  gap.best = true;
  const after = { holds: before.holds - fall[0], minds: before.minds - fall[1] };
  const name = index.batch(batchId)?.name ?? '';
  const what = `Move ${name} ${whither(index, gap)}: ${said(after)} in the season instead of ${said(before)}.`;
  return { batchId, gap, before, after, what };
}

function whither(index: BoardIndex, gap: Gap): string {
  if (gap.key === 'new') return 'to a new shelf, with one more pack';
  const after = gap.afterBatchId === null ? undefined : index.batch(gap.afterBatchId);
  return after
    ? `after ${after.name}`
    : `to the start of ${index.chain(gap.toChainId)?.name ?? 'the shelf'}`;
}

const said = ({ holds, minds }: Tally): string =>
  `${counted(holds, 'hold')} and ${counted(minds, 'mind')}`;

const counted = (count: number, word: string): string =>
  count === 0 ? `no ${word}` : `${count} ${word}${count === 1 ? '' : 's'}`;
