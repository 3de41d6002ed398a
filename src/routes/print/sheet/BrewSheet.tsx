import { useMemo } from 'react';
import { sightOf } from '#shared/chain/boardLink.ts';
import { inherit } from '#shared/chain/inherit.ts';
import { linkInput } from '#shared/chain/linkInput.ts';
import { formatDay } from '#shared/units/day.ts';
import { useBrewery } from '../../../app/useBrewery.ts';
import { useBoardView } from '../../board/view/BoardView.tsx';
import { PaperPage } from '../PaperPage.tsx';
import { PaperMark } from '../PaperVerdict.tsx';
import { NothingToPrint, PrintFrame, useIdInAddress } from '../PrintFrame.tsx';
import { BrewDayChecks } from './BrewDayChecks.tsx';
import { CakeToKeep } from './CakeToKeep.tsx';
import { Poured } from './Poured.tsx';
import { SheetCarries } from './SheetCarries.tsx';
import { SheetCautions } from './SheetCautions.tsx';
import { SheetFindings } from './SheetFindings.tsx';
import type { SheetOf } from './sheetOf.ts';
import { Blank } from './SheetPart.tsx';
import { PourWindowPart } from './PourWindowPart.tsx';

/** One link for the brew day, on one page: what to pour onto what, and boxes to tick. */
export function BrewSheet() {
  return (
    <PrintFrame>
      <FoundLink />
    </PrintFrame>
  );
}

function FoundLink() {
  const laterId = useIdInAddress();
  const { board, index, judged, units } = useBoardView();
  const later = index.batch(laterId);
  const earlier = index.predecessor(laterId);
  const link = judged.links.get(laterId);
  const input = useMemo(() => linkInput(laterId, sightOf(board, units)), [board, laterId, units]);
  if (!later || !earlier || !link || !input)
    return <NothingToPrint title="There is no such link any more" />;
  return <Sheet {...{ earlier, later, link, input }} />;
}

function Sheet(of: SheetOf) {
  const { earlier, later, link, input } = of;
  const { path } = useBrewery();
  const carried = inherit(inherit(input.inherited, input.earlier), input.later);
  return (
    <PaperPage
      title={`${later.name} onto ${earlier.name}`}
      back={{ to: path(`?link=${later.id}`), name: 'The link on the board' }}
    >
      <SheetHead {...of} />
      <div className="mt-2 grid grid-cols-2 gap-x-6 max-tablet:grid-cols-1">
        <div>
          <Poured {...of} />
          <CakeToKeep {...of} />
          <PourWindowPart yeast={input.yeast} rules={input.rules} />
          <SheetCarries carried={carried} />
        </div>
        <div>
          <BrewDayChecks {...of} />
        </div>
      </div>
      <SheetFindings later={later} link={link} />
      <SheetCautions />
    </PaperPage>
  );
}

function SheetHead({ earlier, later, link }: SheetOf) {
  return (
    <header>
      <h1 className="text-[1.75em] leading-[1.1]">
        {later.name} onto {earlier.name}
      </h1>
      <p className="mt-1 flex flex-wrap items-baseline gap-x-4 gap-y-1">
        <span className="text-[1.15em]">
          <PaperMark link={link} />
          {link.accepted && ', accepted'}
        </span>
        <span>
          Brew day: <b>{later.brewOn ? formatDay(later.brewOn) : 'no date yet'}</b>
        </span>
        {link.generation !== null && <span>Generation {link.generation}</span>}
        <span>
          Brewer: <Blank wide />
        </span>
      </p>
    </header>
  );
}
