import { useBoardView } from '../view/BoardView.tsx';
import { NewShelfRow } from './NewShelfRow.tsx';
import { Shelf } from './Shelf.tsx';

export function Shelves() {
  const { index } = useBoardView();
  return (
    <div className="grid gap-1 pb-6 pl-7">
      {index.chains.map((chain) => (
        <Shelf key={chain.id} chain={chain} />
      ))}
      <NewShelfRow />
    </div>
  );
}
