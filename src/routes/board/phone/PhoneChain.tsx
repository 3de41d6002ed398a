import type { Chain } from '#shared/api/chain.ts';
import { formatMoney } from '#shared/units/money.ts';
import { useBrewery } from '../../../app/useBrewery.ts';
import { TextLink } from '../../../components/ui/TextLink.tsx';
import { BestMove } from '../head/BestMove.tsx';
import { UndoButtons } from '../lift/UndoButtons.tsx';
import { GapSlot } from '../lift/GapSlot.tsx';
import { Descent } from '../../descent/Descent.tsx';
import { ChainMenu } from '../shelf/ChainMenu.tsx';
import { ChainName, UnreadMark } from '../shelf/ChainName.tsx';
import { useBoardView } from '../view/BoardView.tsx';
import { count, generationLine, seasonLine, yeastLine } from '../view/words.ts';
import { PhoneBatch } from './PhoneBatch.tsx';
import { PhoneHead } from './PhoneHead.tsx';

export function PhoneChain({ chain }: { chain: Chain }) {
  const { board, index, judged, units, can } = useBoardView();
  const { path } = useBrewery();
  const batches = index.batchesOf(chain.id);
  const verdicts = judged.chains.get(chain.id);
  const yeast = index.yeasts.get(chain.yeastId);
  const cost = verdicts?.costPerBatch ?? null;
  const facts = [
    count(batches.length, 'batch', 'batches'),
    ...(verdicts?.generations
      ? [generationLine(verdicts.generations, verdicts.generationLimit)]
      : []),
    ...(cost === null ? [] : [`${formatMoney(cost, board.brewery.currency)} each`]),
  ];
  return (
    <>
      <PhoneHead title={<ChainName chain={chain} />}>
        <p>{facts.join(' · ')}</p>
        {yeast && <p>{yeastLine(yeast, units)}</p>}
        <Descent chain={chain} />
        <UnreadMark chain={chain} />
      </PhoneHead>
      {can.editChains && (
        <div className="px-3">
          <ChainMenu chain={chain} />
        </div>
      )}
      <div className="relative mt-3">
        <FirstGap chain={chain} />
        <ol className="ml-[18px]" aria-label={`Batches on ${chain.name}`}>
          {batches.map((batch, place) => (
            <PhoneBatch key={batch.id} batch={batch} next={batches[place + 1]} />
          ))}
        </ol>
      </div>
      {batches.length === 0 && (
        <p className="mx-[18px] mt-2 rounded-xl border-[1.5px] border-dashed border-edge px-4 py-3 text-ink2">
          No batch yet. Take one from the bench and move it here.
        </p>
      )}
      <footer className="mx-[18px] mt-6 grid gap-3 border-t border-line pt-4 text-small text-ink2">
        <p>
          <b className="text-ink">{board.season.name}:</b> {seasonLine(judged.totals)}
        </p>
        <p>
          <TextLink to={path('print/season')} className="inline-block py-2.5">
            Print the season
          </TextLink>
        </p>
        {can.moveBatches && (
          <>
            <BestMove />
            <UndoButtons />
          </>
        )}
      </footer>
    </>
  );
}

/** The place before the first batch: while one is lifted it lies over the shelf's own menu. */
function FirstGap({ chain }: { chain: Chain }) {
  const { index } = useBoardView();
  const { shape } = index.vessels.get(chain.vesselId ?? '') ?? { shape: 'bucket' as const };
  return (
    <div
      data-room
      className="pointer-events-none absolute inset-x-[18px] -top-14 z-[2] h-14 data-lifting:pointer-events-auto"
    >
      <GapSlot layout="bar" gapKey={`${chain.id}:first`} vesselShape={shape} />
    </div>
  );
}
