import type { Chain } from '#shared/api/chain.ts';
import { lazyPart } from '../../../app/lazyPart.tsx';
import { useBoardPanel } from '../../board/view/useBoardPanel.ts';
import { useWide } from '../../board/view/useMedia.ts';
import { Talk } from '../../talk/Talk.tsx';
import { WhoIsOn } from './WhoIsOn.tsx';

const LinkPanel = lazyPart(async () => (await import('../../board/panel/LinkPanel.tsx')).LinkPanel);

/** People and talk; a link that is opened takes their place, or lies over the page where there is no room. */
export function ChainSide({ chain }: { chain: Chain }) {
  const wide = useWide();
  const { panel } = useBoardPanel();
  const link = panel?.kind === 'link' ? <LinkPanel laterId={panel.laterId} /> : null;
  return (
    <>
      <aside
        aria-label="People and talk"
        className="thumb-slim border-line bg-paper wide:sticky wide:top-0 wide:h-dvh wide:w-[372px] wide:shrink-0 wide:overflow-y-auto wide:border-l max-wide:border-t print:border-0 print:bg-transparent"
      >
        {wide && link ? link : <PeopleAndTalk chain={chain} />}
      </aside>
      {!wide && link && (
        <aside
          aria-label="Opened link"
          className="fixed inset-y-0 right-0 z-40 w-full overflow-y-auto overscroll-contain border-l border-line bg-paper shadow-card tablet:w-[404px]"
        >
          {link}
        </aside>
      )}
    </>
  );
}

function PeopleAndTalk({ chain }: { chain: Chain }) {
  return (
    <div className="px-6 pt-5 pb-8 max-wide:px-7 max-tablet:px-[18px]">
      <WhoIsOn chain={chain} />
      <h2 className="mt-6 text-shelf">Talk</h2>
      <Talk key={chain.id} chainId={chain.id} />
    </div>
  );
}
