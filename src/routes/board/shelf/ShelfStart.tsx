import type { Chain } from '#shared/api/chain.ts';
import { formatMoney } from '#shared/units/money.ts';
import { GapSlot } from '../lift/GapSlot.tsx';
import { useBoardView } from '../view/BoardView.tsx';
import { SHELF, SHELF_HEIGHT } from '../view/drawing.ts';

/** Where the yeast of a chain comes from, in the room of the gap before its first batch. */
export function ShelfStart({ chain }: { chain: Chain }) {
  const { index } = useBoardView();
  const vessel = chain.vesselId === null ? undefined : index.vessels.get(chain.vesselId);
  return (
    <li
      data-room
      className="relative flex-none"
      style={{ width: SHELF.start, height: SHELF_HEIGHT }}
    >
      <div
        className="lift-fade absolute left-1 z-[2] flex items-end gap-2 pr-2"
        style={{ height: SHELF.top + 1 }}
      >
        <Pack />
        <p className="pb-3 text-small leading-[1.25] text-ink2">
          <StartWords chain={chain} />
        </p>
      </div>
      <div className="pointer-events-none absolute inset-0 z-[5] lifting:pointer-events-auto">
        <GapSlot
          gapKey={`${chain.id}:first`}
          chainId={chain.id}
          afterBatchId={null}
          vesselShape={vessel?.shape ?? 'bucket'}
        />
      </div>
    </li>
  );
}

function Pack() {
  return (
    <svg aria-hidden width="34" height="44" viewBox="0 0 34 44" className="block shrink-0">
      <path
        d="M3 4h28l-1.500 39h-25z"
        className="fill-white stroke-vline"
        strokeWidth="1.8"
        strokeLinejoin="round"
      />
      <path d="M3 9h28" className="stroke-vline" strokeWidth="1.4" strokeDasharray="2 2" />
      <path
        d="M5.500 27q6-2.500 11.500 0t11.500 0l-.8 13.500H6.200z"
        className="fill-cake stroke-cake-dd"
        strokeWidth="1.2"
      />
    </svg>
  );
}

function StartWords({ chain }: { chain: Chain }) {
  const { board, index } = useBoardView();
  const { start } = chain;
  switch (start.kind) {
    case 'pack':
      return start.price === null
        ? 'fresh pack'
        : `fresh pack, ${formatMoney(start.price, board.brewery.currency)}`;
    case 'cake': {
      const source = index.batch(start.batchId);
      return (
        <span className="line-clamp-3">part of the cake of {source?.name ?? 'another batch'}</span>
      );
    }
    case 'outside':
      return `from outside, generation ${start.generation}`;
  }
}
