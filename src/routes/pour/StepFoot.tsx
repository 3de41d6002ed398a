import type { PourFound } from '#shared/api/pour.ts';
import { Button } from '../../components/ui/Button.tsx';
import { Notice } from '../../components/ui/Notice.tsx';
import { usePourView } from './pourView.ts';
import { STEP_NAMES, stepsOf } from './words.ts';

interface StepFootProps {
  /** What this step found, kept with the step. */
  found?: PourFound;
  /** Why one cannot go on yet; absent: one can. */
  wait?: string | undefined;
  /** Something else is to be done first. */
  quiet?: boolean;
}

/** On to the next step, and back. */
export function StepFoot({ found = {}, wait, quiet = false }: StepFootProps) {
  const { run, mine, busy, error, send } = usePourView();
  const steps = stepsOf(run.cakeBatchId !== null);
  const at = steps.indexOf(run.step);
  const [before, next] = [steps[at - 1], steps[at + 1]];
  if (!mine) return null;
  const go = (step: (typeof steps)[number]) =>
    void send({ kind: 'step', body: { runId: run.id, step, found } }).catch(() => undefined);
  return (
    <div className="mt-6 max-w-xl">
      {error && (
        <Notice kind="hold" alert className="mb-3">
          {error}
        </Notice>
      )}
      {wait && <p className="mb-2 text-ink2">{wait}</p>}
      <div className="flex gap-2.5">
        {before && run.state === 'open' && (
          <Button size="large" look="quiet" disabled={busy} onClick={() => go(before)}>
            Back
          </Button>
        )}
        {next && next !== 'after' && (
          <Button
            size="large"
            look={quiet ? 'quiet' : 'first'}
            className="min-w-0 grow whitespace-normal!"
            disabled={busy || wait !== undefined}
            onClick={() => go(next)}
          >
            Next: {STEP_NAMES[next].toLowerCase()}
          </Button>
        )}
      </div>
    </div>
  );
}
