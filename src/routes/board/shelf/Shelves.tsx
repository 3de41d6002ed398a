import { GuestShelves } from '../guest/GuestShelves.tsx';
import { matchesFirst } from '../finding/filter.ts';
import { useMatching } from '../finding/Matching.tsx';
import { useBoardView } from '../view/BoardView.tsx';
import { useShelfViews } from '../view/shelfView.ts';
import { NewShelfRow } from './NewShelfRow.tsx';
import { Shelf } from './Shelf.tsx';

export function Shelves() {
  const view = useBoardView();
  const views = useShelfViews(view);
  const matches = useMatching();
  const { index } = view;
  const chains =
    matches === null
      ? index.chains
      : matchesFirst(index.chains, ({ id }) =>
          index.batchesOf(id).some((batch) => matches.has(batch.id)),
        );
  return (
    <>
      <div className="grid pb-4 pl-7 *:not-first:-mt-4">
        {chains.map(({ id }) => (
          <Shelf key={id} chainId={id} view={views.get(id) ?? view} />
        ))}
        <NewShelfRow />
      </div>
      <GuestShelves />
    </>
  );
}
