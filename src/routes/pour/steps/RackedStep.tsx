import { useState } from 'react';
import { lazyPart } from '../../../app/lazyPart.tsx';
import { StageMark } from '../../../components/drawn/StageMark.tsx';
import { VerdictMark } from '../../../components/drawn/VerdictMark.tsx';
import { Button } from '../../../components/ui/Button.tsx';
import { useBoardView } from '../../board/view/BoardView.tsx';
import { stageLine } from '../../board/view/words.ts';
import { Caution } from '../Caution.tsx';
import { usePourView } from '../pourView.ts';
import { StepFoot } from '../StepFoot.tsx';
import { finishedOf } from './finished.ts';

const StageDialog = lazyPart(
  async () => (await import('../../board/batch/StageDialog.tsx')).StageDialog,
);

/** The earlier beer: finished, and off its cake while the wort chills. */
export function RackedStep() {
  const { cakeOf, mine } = usePourView();
  const { board, units } = useBoardView();
  const [asking, setAsking] = useState(false);
  if (!cakeOf) return null;
  const finished = finishedOf(cakeOf, units);
  const isRacked = cakeOf.stage === 'racked';
  return (
    <>
      <h3 className="mt-4 text-h2">{cakeOf.name} off its cake</h3>
      <p className="mt-2 flex items-center gap-2 text-touch">
        <StageMark stage={cakeOf.stage} />
        {stageLine(cakeOf, board.today)}
      </p>
      <p className={`mt-3 flex gap-2.5 text-touch ${finished.done ? 'text-pour' : 'text-mind'}`}>
        <span className="mt-0.5">
          <VerdictMark verdict={finished.done ? 'pour' : 'mind'} size={22} />
        </span>
        <span>
          <b>{finished.done ? 'Finished' : 'Not known to be finished'}</b>
          <span className="block text-ink">{finished.because}</span>
        </span>
      </p>
      <p className="mt-3 max-w-xl text-ink2">
        Rack it while the wort chills, so that the cake lies bare for less than an hour.
      </p>
      <Caution>
        Carbon dioxide lies in the emptied vessel and low in the room: air the room, and do not lean
        in.
      </Caution>
      {mine && !isRacked && (
        <Button
          look="first"
          size="large"
          className="mt-5 w-full max-w-xl"
          onClick={() => setAsking(true)}
        >
          It is racked
        </Button>
      )}
      <StepFoot quiet={!isRacked} />
      {asking && <StageDialog batch={cakeOf} to="racked" onClose={() => setAsking(false)} />}
    </>
  );
}
