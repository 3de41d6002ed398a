import clsx from 'clsx';
import { memo, useMemo, useState } from 'react';
import type { Gap } from '#shared/chain/gaps.ts';
import type { BoardFacts } from '#shared/chain/board.ts';
import { VerdictPill } from '../../../components/drawn/VerdictPill.tsx';
import { Button } from '../../../components/ui/Button.tsx';
import { isOpen } from './places.ts';
import { runsOf } from './runs.ts';
import { gapDay, gapWord, placeTitle, placeWords, reasonWords, shelfName } from './words.ts';

interface PlacesListProps {
  board: BoardFacts;
  batchId: string;
  ranked: readonly Gap[];
  /** The place that the keys or the pointer are on. */
  over: string | null;
  /** Brings that place into sight in the list; not under a moving pointer. */
  follow?: boolean;
  onPut: (gap: Gap) => void;
}

/** As many as can be read; the rest opens on demand, or when the keys walk there. */
const SHOWN = 12;

/** Ranked places as buttons: all that the gaps on the shelves say, without a drag. */
export function PlacesList(props: PlacesListProps) {
  const { board, batchId, ranked, over, follow = false, onPut } = props;
  const [all, setAll] = useState(false);
  const walkedTo = !follow ? 0 : ranked.findIndex((gap) => gap.key === over) + 1;
  const length = all ? ranked.length : Math.min(ranked.length, Math.max(SHOWN, walkedTo));
  const rest = ranked.length - length;
  const runs = useMemo(
    () => runsOf(ranked.slice(0, length).map((gap) => rowOf(board, gap, batchId))),
    [board, ranked, batchId, length],
  );
  const drawn = (rows: readonly Row[]) =>
    rows.map((row) => (
      <PlaceRow key={row.gap.key} {...row} {...{ onPut, follow }} isOver={row.gap.key === over} />
    ));
  return (
    <>
      <ol className="-mx-3.5 list-none">
        {runs.map(({ shelf, rows }) =>
          rows.length === 1 ? (
            drawn(rows)
          ) : (
            <li key={rows[0]?.gap.key} className="border-b border-line last:border-b-0">
              <h3 className="px-3.5 pt-3 text-h3 [overflow-wrap:anywhere]">{shelf}</h3>
              <ol aria-label={`Places on ${shelf}`} className="list-none">
                {drawn(rows)}
              </ol>
            </li>
          ),
        )}
      </ol>
      {rest > 0 && (
        <Button look="text" size="small" className="mt-1" onClick={() => setAll(true)}>
          Show {rest} more {rest === 1 ? 'place' : 'places'}
        </Button>
      )}
    </>
  );
}

const rowOf = (board: BoardFacts, gap: Gap, batchId: string) => ({
  gap,
  shelf: shelfName(board, gap),
  title: placeTitle(board, gap),
  where: placeWords(board, gap, batchId),
  reason: reasonWords(board, gap),
});

type Row = ReturnType<typeof rowOf>;

interface PlaceRowProps extends Omit<Row, 'shelf'> {
  isOver: boolean;
  follow: boolean;
  onPut: (gap: Gap) => void;
}

const PlaceRow = memo(function PlaceRow(props: PlaceRowProps) {
  const { gap, title, where, reason, isOver, follow, onPut } = props;
  return (
    <li
      ref={(row) => (isOver && follow ? row?.scrollIntoView({ block: 'nearest' }) : undefined)}
      className={clsx(
        'flex items-center gap-3 px-3.5 py-2.5',
        gap.best
          ? 'mb-1 rounded-xl border-2 border-bottle bg-pour-l'
          : 'border-b border-line last:border-b-0',
        isOver && 'rounded-xl bg-bottle-l outline-3 -outline-offset-2 outline-bottle',
      )}
    >
      <div className="min-w-0 grow text-small leading-[1.3] text-ink2">
        <p className="flex flex-wrap items-center gap-x-2.5">
          <VerdictPill verdict={gap.verdict} word={gapWord(gap)} />
          <span className="font-semibold">{gapDay(gap)}</span>
          {gap.best && <b className="text-bottle">Best gap</b>}
        </p>
        <p className="mt-1 font-bold text-ink [overflow-wrap:anywhere]">{title}</p>
        <p>{reason}</p>
      </div>
      {isOpen(gap) ? (
        <Button
          size="small"
          look={gap.best ? 'first' : 'plain'}
          aria-label={`Put here: ${where}`}
          onClick={() => onPut(gap)}
        >
          Put here
        </Button>
      ) : (
        <span className="shrink-0 text-small">here now</span>
      )}
    </li>
  );
});
