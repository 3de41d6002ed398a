import { GuestShelves } from '../guest/GuestShelves.tsx';
import { useBoardView } from '../view/BoardView.tsx';
import { NewShelfRow } from './NewShelfRow.tsx';
import { Shelf } from './Shelf.tsx';

export function Shelves() {
  const { index } = useBoardView();
  return (
    <>
      <div className="grid pb-4 pl-7 *:not-first:-mt-4">
        {index.chains.map((chain) => (
          <Shelf key={chain.id} chain={chain} />
        ))}
        <NewShelfRow />
      </div>
      <GuestShelves />
    </>
  );
}
