import { useState } from 'react';
import { GuestShelves } from '../guest/GuestShelves.tsx';
import { SidePanel } from '../panel/SidePanel.tsx';
import { FilterPart, FindTools } from '../finding/FindTools.tsx';
import { useArrival } from '../finding/useArrival.ts';
import { useSoughtShelf } from '../finding/useSoughtShelf.ts';
import { SeasonSwitch } from '../head/SeasonSwitch.tsx';
import { SeasonNote } from '../head/SeasonNote.tsx';
import { useBoardView } from '../view/BoardView.tsx';
import { ChainChips } from './ChainChips.tsx';
import { PhoneBench } from './PhoneBench.tsx';
import { PhoneChain } from './PhoneChain.tsx';

/** On a phone one chain at a time: its cake runs down the page. */
export function PhoneBoard() {
  const { index } = useBoardView();
  const [wanted, setWanted] = useState<string | null>(null);
  const sought = useSoughtShelf();
  if (sought !== null) setWanted(sought);
  useArrival();
  const [firstChain] = index.chains;
  const chain = wanted === 'bench' ? undefined : (index.chain(wanted ?? '') ?? firstChain);
  return (
    <>
      <main id="main" className="pb-8 text-touch outline-none">
        <div className="flex items-center justify-between gap-2 px-2.5 pt-1.5">
          <SeasonSwitch />
          <FindTools />
        </div>
        <FilterPart />
        <SeasonNote />
        <ChainChips chosen={chain?.id ?? 'bench'} onChoose={setWanted} />
        {chain ? <PhoneChain key={chain.id} chain={chain} /> : <PhoneBench />}
        <GuestShelves />
      </main>
      <SidePanel />
    </>
  );
}
