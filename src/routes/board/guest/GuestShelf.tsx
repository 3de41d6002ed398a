import type { GuestShelf as Guest } from '#shared/api/guest.ts';
import { guestAnchor } from '../../../app/guestAddress.ts';
import { lazyPart } from '../../../app/lazyPart.tsx';
import { ChangesPanel } from '../lift/ChangesPanel.tsx';
import { useLiftPanel } from '../lift/liftContext.ts';
import { LiftProvider } from '../lift/LiftProvider.tsx';
import { PlacesPanel } from '../lift/PlacesPanel.tsx';
import { PhoneBatch } from '../phone/PhoneBatch.tsx';
import { Shelf } from '../shelf/Shelf.tsx';
import { useBoardView } from '../view/BoardView.tsx';
import { useShownByAnchor } from './useShownByAnchor.ts';
import { usePhone } from '../view/useMedia.ts';

/** Seldom used, so it comes when it is shown. */
const LeaveChain = lazyPart(async () => (await import('./LeaveChain.tsx')).LeaveChain);

/** A chain of another brewery, lifted and judged as there, by their house rules. */
export function GuestShelf({ guest }: { guest: Guest }) {
  const view = useBoardView();
  const { index } = view;
  const section = useShownByAnchor(guestAnchor(guest.guestId));
  const phone = usePhone();
  const chain = index.chain(guest.chainId);
  if (!chain) return null;
  return (
    <LiftProvider takesUndo={false}>
      <section
        ref={section}
        id={guestAnchor(guest.guestId)}
        tabIndex={-1}
        aria-label={`${chain.name} from ${guest.fromBrewery}`}
        className="mx-7 border-t-2 border-dashed border-edge pt-2 pb-4 max-tablet:mx-[18px] outline-none max-tablet:mt-6"
      >
        <p className="text-small text-ink2">
          from <b className="text-ink">{guest.fromBrewery}</b> · as {guest.role} · by their house
          rules · <LeaveChain guest={guest} />
        </p>
        {phone ? (
          <>
            <h2 className="mt-1 text-h2 wrap-anywhere">{chain.name}</h2>
            <ol className="mt-3" aria-label={`Batches on ${chain.name}`}>
              {index.batchesOf(chain.id).map((batch, place, all) => (
                <PhoneBatch key={batch.id} batch={batch} next={all[place + 1]} />
              ))}
            </ol>
          </>
        ) : (
          <Shelf chainId={chain.id} view={view} />
        )}
        <GuestPanel />
      </section>
    </LiftProvider>
  );
}

/** What a lift on this shelf has to tell, right under it. */
function GuestPanel() {
  const lift = useLiftPanel();
  if (lift === null) return null;
  return (
    <div className="mt-3 max-w-[404px] rounded-card border border-line bg-paper px-5 py-4">
      {lift === 'places' ? <PlacesPanel /> : <ChangesPanel />}
    </div>
  );
}
