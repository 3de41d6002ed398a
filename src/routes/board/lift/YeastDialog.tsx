import { useId, useState } from 'react';
import { useBoard } from '../../../api/board.ts';
import { Button } from '../../../components/ui/Button.tsx';
import { Dialog } from '../../../components/ui/Dialog.tsx';
import { newShelfFor } from '#shared/chain/newShelf.ts';
import { useLiftMachine, useLiftState } from './liftContext.ts';
import type { LiftState } from './liftState.ts';
import { batchName } from './words.ts';

/** Asks for the yeast of a new shelf where the batch itself asks for none. */
export function YeastDialog() {
  const asked = useLiftState((state) => state.yeastFor);
  return asked === null ? null : <AskYeast asked={asked} />;
}

function AskYeast({ asked }: { asked: NonNullable<LiftState['yeastFor']> }) {
  const board = useBoard();
  const { putting } = useLiftMachine();
  const { batchId, gap, from } = asked;
  const proposed = newShelfFor(board, batchId, 'new')?.yeastId ?? '';
  const [yeastId, setYeastId] = useState(proposed);
  const field = useId();
  return (
    <Dialog
      open
      onClose={putting.giveUp}
      title="Which yeast starts the new shelf?"
      lead={`${batchName(board, batchId)} does not name one. A fresh pack is planned at its usual price.`}
    >
      <form
        onSubmit={(event) => {
          event.preventDefault();
          putting.put(batchId, gap, { yeastId, from });
        }}
      >
        <label htmlFor={field} className="block font-semibold">
          Yeast
        </label>
        <select
          id={field}
          value={yeastId}
          onChange={(event) => setYeastId(event.target.value)}
          className="mt-1 min-h-11 w-full rounded-field border-[1.5px] border-edge bg-white px-3 text-touch"
        >
          {board.yeasts.map((yeast) => (
            <option key={yeast.id} value={yeast.id}>
              {yeast.name}
            </option>
          ))}
        </select>
        <div className="mt-5 flex flex-wrap justify-end gap-3">
          <Button look="quiet" onClick={putting.giveUp}>
            Put it back
          </Button>
          <Button look="first" type="submit">
            Make the shelf
          </Button>
        </div>
      </form>
    </Dialog>
  );
}
