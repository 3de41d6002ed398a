import { useId, useState, type ReactNode } from 'react';
import type { Typed } from '#shared/api/units.ts';
import { FieldError } from '../../../components/form/FieldError.tsx';
import { fieldClass } from '../../../components/form/fieldClass.ts';
import type { NumberKind } from '../../../components/form/readers.ts';
import { rewrite, written } from '../../../components/form/written.ts';
import { useBoardView } from '../view/BoardView.tsx';

export interface InlineQuantityProps {
  kind: NumberKind;
  label: ReactNode;
  value: number | null;
  typed?: Typed[string] | undefined;
  disabled?: boolean;
  /** Why this number cannot be taken, with what to do; null: it can. */
  refuse?: (value: number) => string | null;
  /** The number that was typed, when the field is left or Enter is pressed; null: emptied. */
  onSave: (value: number | null, typed: Typed[string] | null) => void;
}

/** One number that is saved by itself, without a form around it. Nothing that was typed is lost. */
export function InlineQuantity(props: InlineQuantityProps) {
  const { kind, label, value, typed, disabled = false, refuse, onSave } = props;
  const { units } = useBoardView();
  const id = useId();
  const [draft, setDraft] = useState<ReturnType<typeof written> | null>(null);
  const now = draft ?? written(kind, value, units, typed);
  const refused = draft && draft.value !== null && refuse ? refuse(draft.value) : null;
  const why = now.why ?? refused;
  const save = () => {
    if (draft === null || why !== null) return;
    setDraft(null);
    if (draft.value === value) return;
    onSave(
      draft.value,
      draft.value === null ? null : { text: draft.text.trim(), unit: draft.unit },
    );
  };
  return (
    <div>
      <label htmlFor={id} className="mb-1 block text-small font-semibold">
        {label}
      </label>
      <div className="relative">
        <input
          id={id}
          type="text"
          inputMode="decimal"
          autoComplete="off"
          disabled={disabled}
          value={now.text}
          aria-invalid={why !== null}
          aria-describedby={why === null ? `${id}-unit` : `${id}-unit ${id}-why`}
          onChange={(event) => setDraft(rewrite(now, event.target.value, units))}
          onBlur={save}
          onKeyDown={(event) => event.key === 'Enter' && save()}
          className={fieldClass(why !== null, 'pr-14')}
        />
        <span
          id={`${id}-unit`}
          className="pointer-events-none absolute inset-y-0 right-3 grid place-items-center text-ink2"
        >
          {now.unit}
        </span>
      </div>
      <FieldError id={`${id}-why`} message={why ?? undefined} />
    </div>
  );
}
