import type { Duty } from '#shared/today/duty.ts';
import { formatDay } from '#shared/units/day.ts';
import { useBrewery } from '../../app/useBrewery.ts';
import { useUnits } from '../../app/useUnits.ts';
import { EmptyState } from '../../components/ui/EmptyState.tsx';
import { LinkButton } from '../../components/ui/LinkButton.tsx';
import { useBoardView } from '../board/view/BoardView.tsx';
import { dutyWords } from './dutyWords.ts';

/** A week without work: what comes next, and when. */
export function NothingDue({ next }: { next: Duty | null }) {
  const { index, board, can } = useBoardView();
  const units = useUnits();
  const { path } = useBrewery();
  const action = <LinkButton to={path()}>To the board</LinkButton>;
  if (!next)
    return (
      <EmptyState title="Nothing is due" action={action}>
        No brew day is planned. Put a batch on a shelf and give it a day: it is listed here when its
        time comes.
      </EmptyState>
    );
  const { title } = dutyWords(next, { index, units, today: board.today, can });
  return (
    <EmptyState title="Nothing is due this week" action={action}>
      Next: {title}, {formatDay(next.day)}.
    </EmptyState>
  );
}
