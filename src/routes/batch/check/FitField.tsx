import clsx from 'clsx';
import { useController } from 'react-hook-form';
import { JUDGEMENTS } from '#shared/api/cakeCheck.ts';
import type { Verdict } from '#shared/rules/vocabulary.ts';
import { VerdictMark } from '../../../components/drawn/VerdictMark.tsx';
import { FieldError } from '../../../components/form/FieldError.tsx';
import { useField } from '../../../components/form/useField.ts';
import { FIT_WORDS } from './checkWords.ts';

const TONES: Record<Verdict, string> = {
  pour: 'text-pour has-checked:bg-pour-l',
  mind: 'text-mind has-checked:bg-mind-l',
  hold: 'text-hold has-checked:bg-hold-l',
};

/** Fit, with care or unfit, by shape, word and colour. */
export function FitField({ signer }: { signer: string }) {
  const state = useField('judged', false);
  const { field } = useController({ name: 'judged' });
  return (
    <fieldset aria-describedby={state.aria['aria-describedby']}>
      <legend className="mb-1 flex w-full items-baseline gap-2 text-body font-semibold">
        Fit to pour on?
        <span className="ml-auto text-small font-normal text-ink2">{signer} signs this</span>
      </legend>
      <div className="grid grid-cols-3 gap-2">
        {JUDGEMENTS.map((value, at) => {
          const { word, means, verdict } = FIT_WORDS[value];
          return (
            <label
              key={value}
              className={clsx(
                'flex cursor-pointer flex-col items-center gap-1 rounded-xl border-2 border-current bg-white px-1.5 py-2 text-center leading-tight',
                'has-checked:ring-[2.5px] has-checked:ring-bottle has-checked:ring-offset-[3px] has-checked:ring-offset-paper',
                'has-focus-visible:outline-3 has-focus-visible:outline-offset-4 has-focus-visible:outline-current',
                TONES[verdict],
              )}
            >
              <input
                type="radio"
                ref={at === 0 ? field.ref : undefined}
                name={state.id}
                value={value}
                checked={field.value === value}
                onChange={() => field.onChange(value)}
                className="sr-only"
              />
              <VerdictMark verdict={verdict} size={24} />
              <b>{word}</b>
              <span className="text-small text-ink">{means}</span>
            </label>
          );
        })}
      </div>
      <FieldError id={state.errorId} message={state.message} />
    </fieldset>
  );
}
