import type { Batch } from '#shared/api/batch.ts';
import { takenDay } from '#shared/chain/dates.ts';
import { formatDay, formatDayShort } from '#shared/units/day.ts';
import { format } from '#shared/units/quantity.ts';
import { lowered } from '../../../app/lowered.ts';
import { useBrewery } from '../../../app/useBrewery.ts';
import { DateTag } from '../../../components/drawn/DateTag.tsx';
import { Vessel } from '../../../components/drawn/Vessel.tsx';
import { VerdictPill } from '../../../components/drawn/VerdictPill.tsx';
import { TextLink } from '../../../components/ui/TextLink.tsx';
import { useBoardView } from '../../board/view/BoardView.tsx';
import { drawnVessel, vesselOf } from '../../board/view/drawing.ts';
import {
  countedFindings,
  gravityStep,
  shortReason,
  stageLine,
  volumeOf,
} from '../../board/view/words.ts';

/** The batch itself: its vessel large on the shelf, what it came from and what comes after. */
export function BatchSide({ batch }: { batch: Batch }) {
  const { index, board } = useBoardView();
  const { path } = useBrewery();
  const chain = index.chain(batch.chainId ?? '');
  const mates = chain ? index.batchesOf(chain.id) : [];
  const place = mates.findIndex(({ id }) => id === batch.id) + 1;
  return (
    <div className="w-[300px] shrink-0 pt-[18px] pl-7 max-wide:w-auto max-wide:pr-7 max-tablet:px-[18px] print:pl-0">
      <p className="text-small text-ink2">
        {chain ? (
          <>
            <TextLink to={path(`chains/${chain.id}`)}>{chain.name}</TextLink> / batch {place} of{' '}
            {mates.length}
          </>
        ) : (
          <TextLink to={path()}>Board</TextLink>
        )}
      </p>
      <h1 className="mt-1 font-display text-h1 font-bold tracking-[-.025em] wrap-anywhere outline-none">
        {batch.name}
      </h1>
      <p className="text-touch text-ink2">
        {batch.style
          ? `${batch.style}, ${lowered(stageLine(batch, board.today))}`
          : stageLine(batch, board.today)}
      </p>
      <Stand batch={batch} />
      <div className="max-wide:grid max-wide:grid-cols-2 max-wide:gap-x-6 max-tablet:grid-cols-1">
        <PouredOnto batch={batch} />
        <NextOnIt batch={batch} />
      </div>
    </div>
  );
}

function Stand({ batch }: { batch: Batch }) {
  const { index, judged, board, units } = useBoardView();
  const vessel = vesselOf(batch, index);
  const volume = volumeOf(batch);
  const notes = [
    vessel && { name: vessel.name, more: format('volume', vessel.capacityL, units), at: 206 },
    volume !== null && {
      name: format('volume', volume, units),
      more: batch.srm === null ? 'colour unknown' : format('colour', batch.srm, units),
      at: 116,
    },
    { ...useCakeWords(batch), at: 28 },
  ];
  return (
    <div className="mb-6">
      <div className="relative -ml-7 flex h-[290px] items-end pl-7 after:absolute after:inset-x-0 after:bottom-0 after:h-[11px] after:border-b-[1.5px] after:border-shelf3 after:bg-linear-to-b after:from-shelf1 after:to-shelf2 after:shadow-shelf max-tablet:-ml-[18px] max-tablet:pl-[18px]">
        <div className="relative z-[1] mb-[9px]">
          <Vessel {...drawnVessel(batch, index, judged, board.today)} width={144} />
        </div>
        {notes.map(
          (note) =>
            note && (
              <p
                key={note.at}
                style={{ bottom: note.at }}
                className="absolute left-[186px] z-[2] text-small leading-tight text-ink2 before:absolute before:top-2 before:right-[calc(100%+5px)] before:w-[14px] before:border-t-[1.5px] before:border-edge"
              >
                <b className="block text-touch text-ink">{note.name}</b>
                {note.more}
              </p>
            ),
        )}
      </div>
      <div className="mt-2 ml-[50px]">
        <DateTag day={batch.brewOn} large />
      </div>
    </div>
  );
}

/** The cake, and whether its amount was measured or is worked out. */
function useCakeWords(batch: Batch): { name: string; more: string } {
  const { index, judged, units } = useBoardView();
  const measured = batch.cake?.measured;
  const generation = judged.generation.get(batch.id) ?? null;
  const more = generation === null ? '' : `gen ${generation}`;
  if (measured?.volumeL)
    return { name: `${format('volume', measured.volumeL, units)} cake`, more: `${more}, measured` };
  if (measured?.massKg)
    return { name: `${format('mass', measured.massKg, units)} cake`, more: `${more}, weighed` };
  const mates = batch.chainId === null ? [] : index.batchesOf(batch.chainId);
  const next = mates[mates.findIndex(({ id }) => id === batch.id) + 1];
  const litres = next ? (judged.links.get(next.id)?.cake.volumeL ?? null) : null;
  const name = litres === null ? 'Cake' : `${format('volume', litres, units)} cake`;
  return { name, more: litres === null ? more : `${more}, estimated` };
}

const LINK = 'border-t border-line py-3.5 leading-tight';

function PouredOnto({ batch }: { batch: Batch }) {
  const { index, judged, units } = useBoardView();
  const { path } = useBrewery();
  const before = index.predecessor(batch.id);
  const link = judged.links.get(batch.id);
  if (!before || !link) return null;
  return (
    <div className={LINK}>
      <p className="text-small text-ink2">
        {batch.stage === 'pencilled' ? 'Goes onto the cake of' : 'Poured onto the cake of'}
      </p>
      <p className="mb-1.5 font-bold">
        <TextLink to={path(`batches/${before.id}`)}>{before.name}</TextLink>
      </p>
      <VerdictPill
        verdict={link.verdict}
        findings={countedFindings(link)}
        unchecked={link.unchecked.length}
      />
      <p className="mt-1 text-small text-ink2">
        {shortReason(link, gravityStep(before, batch, units))}
      </p>
    </div>
  );
}

function NextOnIt({ batch }: { batch: Batch }) {
  const { index, judged, units } = useBoardView();
  const { path } = useBrewery();
  const mates = batch.chainId === null ? [] : index.batchesOf(batch.chainId);
  const next = mates[mates.findIndex(({ id }) => id === batch.id) + 1];
  const link = next && judged.links.get(next.id);
  if (!next || !link) return null;
  const day = next.brewOn ?? takenDay(batch, next);
  return (
    <div className={LINK}>
      <p className="text-small text-ink2">
        Next on this cake
        {day && (
          <>
            , <span title={formatDay(day)}>{formatDayShort(day)}</span>
          </>
        )}
      </p>
      <p className="mb-1.5 font-bold">
        <TextLink to={path(`batches/${next.id}`)}>{next.name}</TextLink>
      </p>
      <VerdictPill
        verdict={link.verdict}
        findings={countedFindings(link)}
        unchecked={link.unchecked.length}
      />
      <p className="mt-1 text-small text-ink2">
        {shortReason(link, gravityStep(batch, next, units))}
      </p>
    </div>
  );
}
