import { useId, useRef, useState } from 'react';
import type { Typed } from '#shared/api/units.ts';
import { sentenceOf } from '../../../api/errors.ts';
import { newId } from '../../../app/newId.ts';
import { FieldError } from '../../../components/form/FieldError.tsx';
import { rewrite, written } from '../../../components/form/written.ts';
import { useBoardView } from '../../board/view/BoardView.tsx';
import { usePourView } from '../pourView.ts';
import { deviceTime } from './deviceTime.ts';
import { readingFault } from './readingFault.ts';

/** A reading: a few digits and one tap. What was typed stays until the server has it. */
export function ReadingEntry() {
  const { run, busy, send } = usePourView();
  const { units } = useBoardView();
  const id = useId();
  const input = useRef<HTMLInputElement>(null);
  const [draft, setDraft] = useState(() => written('temperature', null, units));
  const [fault, setFault] = useState<string | null>(null);
  const now = draft.prefs === units ? draft : rewrite(draft, draft.text, units);
  const log = async () => {
    const why = readingFault(now, units);
    setFault(why);
    if (why !== null || now.value === null) return input.current?.focus();
    const typed: Typed = now.typed ? { c: now.typed } : {};
    try {
      await send({
        kind: 'read',
        body: { runId: run.id, id: newId(), c: now.value, typed, ...deviceTime() },
      });
      // The next one may be typed by now.
      setDraft((then) => (then.text === now.text ? written('temperature', null, units) : then));
    } catch (error) {
      // The digits stay in the field.
      setFault(sentenceOf(error));
    }
  };
  return (
    <form
      noValidate
      className="mt-4"
      onSubmit={(event) => {
        event.preventDefault();
        void log();
      }}
    >
      <label htmlFor={id} className="block font-semibold">
        The thermometer shows
      </label>
      <div className="mt-1 flex gap-2.5">
        <div className="relative min-w-0 flex-1">
          <input
            ref={input}
            id={id}
            type="text"
            inputMode="decimal"
            enterKeyHint="done"
            autoComplete="off"
            value={now.text}
            aria-invalid={fault !== null}
            aria-describedby={`${id}-unit ${id}-why`}
            onChange={(event) => {
              setFault(null);
              setDraft(rewrite(now, event.target.value, units));
            }}
            className={`min-h-15 w-full min-w-0 rounded-xl border-2 bg-white pr-24 pl-4 text-big font-bold tabular-nums ${fault ? 'border-hold' : 'border-ink'}`}
            style={{ fontSize: '1.6rem' }}
          />
          <span
            id={`${id}-unit`}
            className="pointer-events-none absolute inset-y-0 right-4 grid place-items-center text-lead text-ink2"
          >
            {now.unit} now
          </span>
        </div>
        <button
          type="submit"
          disabled={busy}
          className="min-h-15 rounded-xl bg-ink px-6 text-lead font-bold text-stone disabled:opacity-60"
        >
          Log
        </button>
      </div>
      <FieldError id={`${id}-why`} message={fault ?? undefined} />
    </form>
  );
}
