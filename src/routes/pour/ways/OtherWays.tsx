import { useMemo, useState } from 'react';
import type { Batch } from '#shared/api/batch.ts';
import { formatDay } from '#shared/units/day.ts';
import { newId } from '../../../app/newId.ts';
import { useBoardView } from '../../board/view/BoardView.tsx';
import { WayDialog } from './WayDialog.tsx';
import { WayFacts } from './WayFacts.tsx';
import { waysFor, type Way } from './ways.ts';

/** Where the cake is unfit or not there: what else, with its verdict and cost; two taps each. */
export function OtherWays({ batch, cakeOf }: { batch: Batch; cakeOf: Batch }) {
  const { board, units, can } = useBoardView();
  const [chosen, setChosen] = useState<Way | null>(null);
  const ways = useMemo(
    () => (batch.stage === 'pencilled' ? waysFor(board, batch, newId, units) : []),
    [board, batch, units],
  );
  if (!can.moveAcross || ways.length === 0) return null;
  const { cake } = cakeOf;
  const isGone = cake !== null && cake.state !== 'bare' && cake.state !== 'growing';
  const isUnfit = isGone || cake?.check?.judged === 'unfit';
  return (
    <details className="mt-6 max-w-xl border-t border-line pt-2" open={isUnfit}>
      <summary className="min-h-11 cursor-pointer py-2.5 font-medium">
        Not onto this cake: other ways
      </summary>
      <ul className="mt-1 grid gap-2.5">
        {ways.map((way) => (
          <li key={`${way.kind} ${way.source?.id ?? ''}`}>
            <button
              type="button"
              onClick={() => setChosen(way)}
              className="grid w-full gap-1 rounded-xl border-[1.5px] border-edge bg-white px-4 py-3 text-left text-touch hover:bg-bottle-l"
            >
              <b>{titleOf(way)}</b>
              <WayFacts way={way} />
            </button>
          </li>
        ))}
      </ul>
      {chosen && (
        <WayDialog
          way={chosen}
          title={titleOf(chosen)}
          batch={batch}
          onClose={() => setChosen(null)}
        />
      )}
    </details>
  );
}

function titleOf(way: Way): string {
  switch (way.kind) {
    case 'fresh':
      return 'A fresh pack';
    case 'other-cake':
      return `Part of the cake of ${way.source?.name ?? 'another batch'}`;
    case 'other-day':
      return `Another day: ${way.days[0] ? formatDay(way.days[0].brewOn) : ''}`;
  }
}
