import { useState } from 'react';
import type { PourFound } from '#shared/api/pour.ts';
import { format } from '#shared/units/quantity.ts';
import { KeepCake } from '../../board/panel/KeepCake.tsx';
import { useLinkDraft } from '../../board/panel/useLinkDraft.ts';
import { useBoardView } from '../../board/view/BoardView.tsx';
import { Caution } from '../Caution.tsx';
import { usePourView } from '../pourView.ts';
import { StepFoot } from '../StepFoot.tsx';
import { restOf } from './rest.ts';

/** How much of the cake stays, and where the rest of it goes. */
export function KeepStep() {
  const { batch, cakeOf, run } = usePourView();
  const [rest, setRest] = useState<PourFound['rest']>(run.found.rest ?? null);
  const draft = useLinkDraft(batch.id, cakeOf?.id ?? '');
  const { units } = useBoardView();
  const left = draft ? restOf(draft.answer) : 0;
  return (
    <>
      <div className="mt-2 max-w-xl">
        {draft ? (
          <KeepCake draft={draft} />
        ) : (
          <p className="mt-3 text-ink2">The cake cannot be estimated.</p>
        )}
      </div>
      {left > 0 && (
        <fieldset className="mt-5 max-w-xl">
          <legend className="text-h3 font-[680]">
            Where the other {format('smallVolume', left, units)} goes
          </legend>
          <div className="mt-2 grid grid-cols-2 gap-2.5">
            <RestChoice value="jar" now={rest} onPick={setRest}>
              Into a jar
            </RestChoice>
            <RestChoice value="dumped" now={rest} onPick={setRest}>
              Dumped
            </RestChoice>
          </div>
          {rest === 'jar' && (
            <Caution>Keep the lid of a jar loose: living yeast bursts a closed one.</Caution>
          )}
        </fieldset>
      )}
      <StepFoot
        found={{ rest: left > 0 ? (rest ?? null) : null }}
        wait={left > 0 && !rest ? 'Say where the rest goes.' : undefined}
      />
    </>
  );
}

interface RestChoiceProps {
  value: 'jar' | 'dumped';
  now: PourFound['rest'];
  onPick: (value: 'jar' | 'dumped') => void;
  children: string;
}

function RestChoice({ value, now, onPick, children }: RestChoiceProps) {
  return (
    <label className="grid min-h-13 place-items-center rounded-xl border-[1.5px] border-edge bg-white px-3 text-touch font-semibold has-checked:border-bottle has-checked:bg-bottle has-checked:text-on-bottle has-focus-visible:outline-3 has-focus-visible:outline-offset-2 has-focus-visible:outline-current">
      <input
        type="radio"
        name="rest-of-the-cake"
        value={value}
        checked={now === value}
        onChange={() => onPick(value)}
        className="sr-only"
      />
      {children}
    </label>
  );
}
