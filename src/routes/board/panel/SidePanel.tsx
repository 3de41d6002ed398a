import { useEffect } from 'react';
import { lazyPart } from '../../../app/lazyPart.tsx';
import { useFrameLater } from '../../../app/useFrameLater.ts';
import { OnBoardOf } from '../guest/OnBoardOf.tsx';
import { ChangesPanel } from '../lift/ChangesPanel.tsx';
import { useLiftMachine, useLiftPanel, useLiftState } from '../lift/liftContext.ts';
import { PlacesPanel } from '../lift/PlacesPanel.tsx';
import { useBoardPanel } from '../view/useBoardPanel.ts';
import { useWide } from '../view/useMedia.ts';
import { AttentionPanel } from './AttentionPanel.tsx';

/** All that is told of a link, loaded with the first link that is opened. */
const LinkPanel = lazyPart(async () => (await import('./LinkPanel.tsx')).LinkPanel);

/** The newest wins: a lift closes what stands open, opening something puts the last change away. */
function useOneAtATime(openLink: string | null, isLifted: boolean, close: () => void) {
  const { store } = useLiftMachine();
  useEffect(() => {
    if (openLink) store.set({ change: null, refusal: null });
  }, [openLink, store]);
  useEffect(() => {
    if (isLifted && openLink) close();
  }, [isLifted, openLink, close]);
}

/** What a drop changed is told a frame after the shelves show it: in one frame both would be felt. */
function useToldLift() {
  const lift = useLiftPanel();
  const before = useFrameLater(lift);
  return lift === 'changes' && before !== 'changes' ? null : lift;
}

/** Beside the shelves where there is room; over them, from the side or the foot, where not. */
export function SidePanel() {
  const wide = useWide();
  const lift = useToldLift();
  const { panel, close } = useBoardPanel();
  const openLink = panel?.kind === 'link' ? panel.laterId : null;
  useOneAtATime(openLink, lift === 'places', close);
  const link =
    openLink !== null && lift !== 'places' ? (
      <OnBoardOf batchId={openLink}>
        <LinkPanel laterId={openLink} />
      </OnBoardOf>
    ) : null;
  if (wide)
    return (
      <aside
        data-cover
        aria-label="Beside the shelves"
        className="thumb-slim print:hidden sticky top-0 h-dvh w-[372px] shrink-0 overflow-y-auto border-l border-line bg-paper"
      >
        {link ?? <AtRest lift={lift} />}
      </aside>
    );
  if (link)
    return (
      <aside
        data-cover
        aria-label="Opened link"
        className="print:hidden fixed inset-y-0 right-0 z-40 w-full overflow-y-auto overscroll-contain border-l border-line bg-paper shadow-card tablet:w-[404px]"
      >
        {link}
      </aside>
    );
  return <Below lift={lift} />;
}

/** What to look at only gives way to a lift: to make it anew as the batch is put down would be felt. */
function AtRest({ lift }: { lift: ReturnType<typeof useLiftPanel> }) {
  return (
    <>
      {lift && <Lifting lift={lift} />}
      <div hidden={lift === 'places'}>
        <AttentionPanel />
      </div>
    </>
  );
}

/** Without room at the side, lifting tells its places and its changes along the foot. */
function Below({ lift }: { lift: ReturnType<typeof useLiftPanel> }) {
  const by = useLiftState((state) => state.lifted?.by);
  // A pointer sees the gaps themselves; the list would lie over some of them.
  if (lift === null || (lift === 'places' && by === 'pointer')) return null;
  return (
    <aside
      data-cover
      aria-label="Lifting"
      className="thumb-slim print:hidden fixed inset-x-0 bottom-0 z-30 max-h-[38dvh] overflow-y-auto overscroll-contain rounded-t-2xl border-t border-line bg-paper shadow-card max-tablet:bottom-[72px] tablet:right-4 tablet:left-auto tablet:w-[404px] tablet:rounded-2xl tablet:border"
    >
      <Lifting lift={lift} />
    </aside>
  );
}

function Lifting({ lift }: { lift: 'places' | 'changes' }) {
  return <div className="px-6 py-5">{lift === 'places' ? <PlacesPanel /> : <ChangesPanel />}</div>;
}
