import { useQuery } from '@tanstack/react-query';
import type { GuestShelf as Guest } from '#shared/api/guest.ts';
import { boardQuery } from '../../../api/board.ts';
import { ChangesPanel } from '../lift/ChangesPanel.tsx';
import { useLiftPanel } from '../lift/liftContext.ts';
import { LiftProvider } from '../lift/LiftProvider.tsx';
import { PlacesPanel } from '../lift/PlacesPanel.tsx';
import { PhoneBatch } from '../phone/PhoneBatch.tsx';
import { Shelf } from '../shelf/Shelf.tsx';
import { useBoardView } from '../view/BoardView.tsx';
import { usePhone } from '../view/useMedia.ts';

/** Their changes are not told as they happen: the shelf is read anew while it is looked at. */
const READ_AGAIN_MS = 10_000;

/** A chain of another brewery, lifted and judged as there, by their house rules. */
export function GuestShelf({ guest }: { guest: Guest }) {
  const view = useBoardView();
  const { index, slug } = view;
  useQuery({ ...boardQuery(slug), refetchInterval: READ_AGAIN_MS });
  const phone = usePhone();
  const chain = index.chain(guest.chainId);
  if (!chain) return null;
  return (
    <LiftProvider takesUndo={false}>
      <section
        aria-label={`${chain.name} from ${guest.fromBrewery}`}
        className="mx-7 border-t-2 border-dashed border-edge pt-2 pb-4 max-tablet:mx-[18px] max-tablet:mt-6"
      >
        <p className="text-small text-ink2">
          from <b className="text-ink">{guest.fromBrewery}</b> · as {guest.role} · by their house
          rules
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
