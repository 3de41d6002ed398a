import clsx from 'clsx';
import { usePourView } from './pourView.ts';
import { STEP_NAMES, stepsOf } from './words.ts';

/** How far it is: done, now, still to come. */
export function StepBar() {
  const { run } = usePourView();
  const steps = stepsOf(run.cakeBatchId !== null);
  const at = steps.indexOf(run.step);
  return (
    <div>
      <div className="flex gap-1.5" aria-hidden>
        {steps.map((step, place) => (
          <span
            key={step}
            className={clsx(
              'h-1.5 flex-1 rounded-full',
              place < at || run.state === 'poured'
                ? 'bg-bottle'
                : place === at
                  ? 'bg-cake-d'
                  : 'bg-line',
            )}
          />
        ))}
      </div>
      <h2 className="mt-3 font-sans text-touch font-normal text-ink2" aria-live="polite">
        Step {at + 1} of {steps.length} · {STEP_NAMES[run.step]}
      </h2>
    </div>
  );
}
