import { useState } from 'react';
import { Caution } from '../Caution.tsx';
import { usePourView } from '../pourView.ts';
import { StepFoot } from '../StepFoot.tsx';
import { Tick } from '../Tick.tsx';

/** All that touches cooled wort is cleaned, then sanitised. */
export function CleanStep() {
  const { run, mine } = usePourView();
  const [cleaned, setCleaned] = useState(run.found.cleaned ?? false);
  const [sanitised, setSanitised] = useState(run.found.sanitised ?? false);
  return (
    <>
      <h3 className="mt-4 text-h2">Everything that touches the wort</h3>
      <div className="mt-3 grid max-w-xl gap-2.5">
        <Tick checked={cleaned} disabled={!mine} onChange={setCleaned}>
          Cleaned: hoses, lid, airlock or blow-off tube, thermometer
        </Tick>
        <Tick checked={sanitised} disabled={!mine} onChange={setSanitised}>
          Sanitised, for as long as its maker says
        </Tick>
      </div>
      <Caution>
        Caustic and sanitiser burn skin and eyes: wear goggles and gloves, follow the maker’s
        strength and time, and never mix the two.
      </Caution>
      <Caution>
        Hot wort burns, and shatters cold glass: chill it before it is moved, and never alone on wet
        steps.
      </Caution>
      <StepFoot
        found={{ cleaned, sanitised }}
        wait={cleaned && sanitised ? undefined : 'Tick both when they are done.'}
      />
    </>
  );
}
