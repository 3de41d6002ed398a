import { useMemo } from 'react';
import type { Batch } from '#shared/api/batch.ts';
import type { PourRun } from '#shared/api/pour.ts';
import { leaveAt } from '#shared/pour/leave.ts';
import { endsLeave, pourStanding } from '#shared/pour/standing.ts';
import { sentenceOf } from '../../api/errors.ts';
import { usePourCommand } from '../../api/pour.ts';
import { Notice } from '../../components/ui/Notice.tsx';
import { useBoardView } from '../board/view/BoardView.tsx';
import { Follower } from './Follower.tsx';
import { LeaveRun } from './LeaveRun.tsx';
import { PourViewOf, usePourView, type PourView } from './pourView.ts';
import { StepBar } from './StepBar.tsx';
import { AfterStep } from './steps/AfterStep.tsx';
import { CakeStep } from './steps/CakeStep.tsx';
import { CleanStep } from './steps/CleanStep.tsx';
import { KeepStep } from './steps/KeepStep.tsx';
import { RackedStep } from './steps/RackedStep.tsx';
import { WortStep } from './steps/WortStep.tsx';
import { useNow } from './useNow.ts';
import { useWakeLock } from './useWakeLock.ts';
import { AskedOverride } from './wort/AskedOverride.tsx';

interface RunningPourProps {
  run: PourRun;
  batch: Batch;
  cakeOf: Batch | null;
}

const TICK_MS = 5000;

/** A run under way, or the wort just poured: one step at a time. */
export function RunningPour(props: RunningPourProps) {
  const view = useView(props);
  useWakeLock(view?.run.state === 'open');
  if (!view) return <Notice kind="hold">This batch stands on no shelf any more.</Notice>;
  return (
    <PourViewOf value={view}>
      <StepBar />
      <Follower />
      <AskedOverride />
      <Step />
      <LeaveRun />
    </PourViewOf>
  );
}

function useView({ run, batch, cakeOf }: RunningPourProps): PourView | null {
  const { board, slug, units } = useBoardView();
  const ticked = useNow(TICK_MS);
  // A reading that was just written down counts at once, not at the next tick.
  const now = Math.max(ticked, ...run.readings.map(({ at }) => Date.parse(at)));
  const command = usePourCommand(slug, batch.id);
  const standing = useMemo(
    () =>
      pourStanding({
        board,
        batchId: batch.id,
        at: now,
        day: board.today,
        readings: run.readings
          .filter(({ withdrawn, at }) => !withdrawn && Date.parse(at) <= now)
          .map(({ at, c }) => ({ at: Date.parse(at), c })),
        coolantC: run.found.coolantC,
        units,
      }),
    [board, batch.id, run, now, units],
  );
  if (!standing) return null;
  return {
    run,
    batch,
    cakeOf,
    now,
    standing,
    leave: leaveAt(run, now, endsLeave(standing)),
    // Also without a connection: what is written down then is kept and sent later.
    mine: run.heldBy.personId === board.me.personId && board.me.can.setStages,
    send: command.mutateAsync,
    busy: command.isPending,
    error: command.error ? sentenceOf(command.error) : null,
  };
}

function Step() {
  const { run } = usePourView();
  switch (run.step) {
    case 'racked':
      return <RackedStep />;
    case 'cake':
      return <CakeStep />;
    case 'keep':
      return <KeepStep />;
    case 'clean':
      return <CleanStep />;
    case 'wort':
      return <WortStep />;
    case 'after':
      return <AfterStep />;
  }
}
