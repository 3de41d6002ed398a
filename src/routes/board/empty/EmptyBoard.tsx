import { SeasonNote } from '../head/SeasonNote.tsx';
import { SeasonSwitch } from '../head/SeasonSwitch.tsx';
import { useBoardView } from '../view/BoardView.tsx';
import { EmptyShelf } from './EmptyShelf.tsx';
import { FirstSteps } from './FirstSteps.tsx';

/** The board on day one: what will stand here, and the three things to begin with. */
export function EmptyBoard() {
  const { can } = useBoardView();
  return (
    <main id="main" className="flex grow flex-col outline-none">
      <SeasonNote />
      <div className="px-12 pt-4 max-wide:px-5 max-tablet:px-2.5">
        <SeasonSwitch />
      </div>
      <header className="px-14 pt-4 max-wide:px-7 max-tablet:px-[18px]">
        <h1 className="text-h0 font-[730] tracking-[-0.03em] max-tablet:text-h1">
          The shelf is empty.
        </h1>
        <p className="mt-2 max-w-[640px] text-lead text-ink2">
          {can.editChains
            ? 'Put one yeast on it and write down the next two or three beers. Barmkin then shows which can follow which, and when.'
            : 'Nobody has put a yeast on it yet.'}
        </p>
      </header>
      <EmptyShelf />
      <FirstSteps />
      <section
        aria-labelledby="bench"
        className="mt-auto flex items-center gap-4 border-t-[3px] border-shelf2 bg-bench px-14 py-3.5 max-wide:px-7 max-tablet:flex-col max-tablet:items-start max-tablet:px-[18px]"
      >
        <h2 id="bench" className="w-[140px] shrink-0 text-h3 leading-[1.15]">
          On the bench
          <small className="block font-sans text-small font-normal tracking-normal text-ink2">
            beers without a cake
          </small>
        </h2>
        <p className="flex-1 rounded-xl border-[1.5px] border-dashed border-edge px-4 py-3 text-ink2">
          Nothing here yet. New batches wait on the bench until you put them on a shelf.
        </p>
      </section>
    </main>
  );
}
