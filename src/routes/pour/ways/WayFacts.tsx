import { formatMoney } from '#shared/units/money.ts';
import { VerdictPill } from '../../../components/drawn/VerdictPill.tsx';
import { useBoardView } from '../../board/view/BoardView.tsx';
import { countedFindings } from '../../board/view/words.ts';
import type { Way } from './ways.ts';

/** Verdict, cost and first reason of a way. */
export function WayFacts({ way }: { way: Way }) {
  const { board } = useBoardView();
  const cost =
    way.cost === null
      ? 'price of a pack not known'
      : way.cost === 0
        ? 'nothing to buy'
        : `${formatMoney(way.cost, board.brewery.currency)} for a pack`;
  return (
    <span className="flex flex-wrap items-center gap-x-3 gap-y-1 text-body text-ink2">
      {way.link ? (
        <VerdictPill verdict={way.link.verdict} findings={countedFindings(way.link)} />
      ) : (
        <span>no link: generation 1</span>
      )}
      <span>{cost}</span>
      {way.link?.findings[0] && <span>{way.link.findings[0].title}</span>}
    </span>
  );
}
