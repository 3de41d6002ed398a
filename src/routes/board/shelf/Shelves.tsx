import { GuestShelves } from '../guest/GuestShelves.tsx';
import { useBoardView } from '../view/BoardView.tsx';
import { useShelfViews } from '../view/shelfView.ts';
import { NewShelfRow } from './NewShelfRow.tsx';
import { Shelf } from './Shelf.tsx';

export function Shelves() {
  const view = useBoardView();
  const views = useShelfViews(view);
  return (
    <>
      <div className="grid pb-4 pl-7 *:not-first:-mt-4">
        {view.index.chains.map(({ id }) => (
          <Shelf key={id} chainId={id} view={views.get(id) ?? view} />
        ))}
        <NewShelfRow />
      </div>
      <GuestShelves />
    </>
  );
}
