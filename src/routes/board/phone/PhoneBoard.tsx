import { useState } from 'react';
import { GuestShelves } from '../guest/GuestShelves.tsx';
import { SidePanel } from '../panel/SidePanel.tsx';
import { useBoardView } from '../view/BoardView.tsx';
import { ChainChips } from './ChainChips.tsx';
import { PhoneBench } from './PhoneBench.tsx';
import { PhoneChain } from './PhoneChain.tsx';

/** On a phone one chain at a time: its cake runs down the page. */
export function PhoneBoard() {
  const { index } = useBoardView();
  const [wanted, setWanted] = useState<string | null>(null);
  const [firstChain] = index.chains;
  const chain = wanted === 'bench' ? undefined : (index.chain(wanted ?? '') ?? firstChain);
  return (
    <>
      <main id="main" className="pb-8 text-touch outline-none">
        <ChainChips chosen={chain?.id ?? 'bench'} onChoose={setWanted} />
        {chain ? <PhoneChain key={chain.id} chain={chain} /> : <PhoneBench />}
        <GuestShelves />
      </main>
      <SidePanel />
    </>
  );
}
