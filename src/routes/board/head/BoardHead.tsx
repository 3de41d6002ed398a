import { Printer } from 'lucide-react';
import { Link } from 'react-router-dom';
import { useBrewery } from '../../../app/useBrewery.ts';
import { Button } from '../../../components/ui/Button.tsx';
import { LinkButton } from '../../../components/ui/LinkButton.tsx';
import { FindTools } from '../finding/FindTools.tsx';
import { UndoButtons } from '../lift/UndoButtons.tsx';
import { useBoardView } from '../view/BoardView.tsx';
import { useBoardPanel } from '../view/useBoardPanel.ts';
import { seasonLine } from '../view/words.ts';
import { BestMove } from './BestMove.tsx';
import { SeasonSwitch } from './SeasonSwitch.tsx';

/** The season, its sum in one line, and what begins from here. */
export function BoardHead() {
  const { judged, can } = useBoardView();
  const { open } = useBoardPanel();
  const { path } = useBrewery();
  return (
    <header className="flex flex-wrap items-end gap-x-5 gap-y-3 px-7 pt-4 pb-1.5">
      <div className="min-w-0 flex-1 basis-80">
        <div className="flex items-center gap-1">
          <h1 className="text-h1 tracking-[-0.025em]">
            <SeasonName />
          </h1>
          <SeasonSwitch isBare />
        </div>
        <p className="mt-0.5 text-ink2">{seasonLine(judged.totals)}</p>
      </div>
      <div className="flex flex-wrap items-center gap-2.5 print:hidden">
        <FindTools />
        {can.moveBatches && <UndoButtons />}
        <LinkButton to={path('print/season')}>
          <Printer size={17} aria-hidden />
          Print
        </LinkButton>
        {can.editChains && (
          <Button onClick={() => open({ kind: 'new', what: 'chain' })}>New shelf</Button>
        )}
        {can.editBatches && (
          <Button look="first" onClick={() => open({ kind: 'new', what: 'batch' })}>
            New batch
          </Button>
        )}
      </div>
      {can.moveBatches && <BestMove />}
    </header>
  );
}

/** The head brewer renames the season on its page. */
function SeasonName() {
  const { board, can } = useBoardView();
  const { path } = useBrewery();
  if (!can.editSeason) return board.season.name;
  return (
    <Link
      to={path('season')}
      title="Name, brew days and blocked days"
      className="decoration-2 underline-offset-4 hover:underline"
    >
      {board.season.name}
    </Link>
  );
}
