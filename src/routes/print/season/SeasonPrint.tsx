import { formatDay } from '#shared/units/day.ts';
import { useBrewery } from '../../../app/useBrewery.ts';
import { VerdictMark } from '../../../components/drawn/VerdictMark.tsx';
import { useBoardView } from '../../board/view/BoardView.tsx';
import { seasonLine } from '../../board/view/words.ts';
import { PaperPage } from '../PaperPage.tsx';
import { PrintFrame } from '../PrintFrame.tsx';
import { PrintedBench } from './PrintedBench.tsx';
import { PrintedShelf } from './PrintedShelf.tsx';

/** All shelves of a season and its bench on paper. */
export function SeasonPrint() {
  return (
    <PrintFrame>
      <PrintedSeason />
    </PrintFrame>
  );
}

function PrintedSeason() {
  const { board, index, judged } = useBoardView();
  const { path } = useBrewery();
  return (
    <PaperPage title={board.season.name} back={{ to: path(), name: 'Board' }}>
      <header>
        <h1 className="text-[1.9em] leading-[1.1]">{board.season.name}</h1>
        <p className="mt-0.5">
          {board.brewery.name}, as it stood on {formatDay(board.today)} ·{' '}
          {seasonLine(judged.totals)}
        </p>
        <Legend />
      </header>
      {index.chains.map((chain) => (
        <PrintedShelf key={chain.id} chain={chain} />
      ))}
      <PrintedConflicts />
      <PrintedBench />
    </PaperPage>
  );
}

/** What the signs mean, where nobody can ask the page. */
function Legend() {
  return (
    <p className="mt-2 border-y border-line py-1">
      Under each batch: what is said of pouring it onto the cake of the batch before it.{' '}
      {(['pour', 'mind', 'hold'] as const).map((verdict) => (
        <span key={verdict} className="mr-3 whitespace-nowrap">
          <span className="mr-1 inline-block align-[-0.15em]">
            <VerdictMark verdict={verdict} size={13} />
          </span>
          {MEANING[verdict]}
        </span>
      ))}
    </p>
  );
}

const MEANING = {
  pour: 'Pour: nothing speaks against it',
  mind: 'Mind: it can be done with care',
  hold: 'Hold: not like this',
} as const;

function PrintedConflicts() {
  const { conflicts } = useBoardView().judged;
  if (conflicts.length === 0) return null;
  return (
    <section className="mt-5 break-inside-avoid">
      <h2 className="text-[1.3em]">Vessels and days that collide</h2>
      <ul className="mt-1 list-disc pl-5">
        {conflicts.map(({ text }) => (
          <li key={text}>{text}</li>
        ))}
      </ul>
    </section>
  );
}
