import { useId, useState } from 'react';
import { overrideAnswer } from '#shared/api/pour.ts';
import { sentenceOf } from '../../../api/errors.ts';
import { useUnsaved } from '../../../app/unsaved.ts';
import { FieldError } from '../../../components/form/FieldError.tsx';
import { fieldClass } from '../../../components/form/fieldClass.ts';
import { Button } from '../../../components/ui/Button.tsx';

interface ReasonFormProps {
  label: string;
  action: string;
  busy: boolean;
  onReason: (reason: string) => Promise<unknown>;
  /** A second answer beside the first, with the same reason. */
  other?: { action: string; onReason: (reason: string) => Promise<unknown> };
}

/** A written reason, without which a head brewer takes nothing on. */
export function ReasonForm({ label, action, busy, onReason, other }: ReasonFormProps) {
  const id = useId();
  const [reason, setReason] = useState('');
  const [why, setWhy] = useState<string>();
  useUnsaved(reason.trim() !== '' && !busy);
  const submit = async (how: (reason: string) => Promise<unknown>) => {
    const parsed = overrideAnswer.shape.reason.safeParse(reason);
    setWhy(parsed.error?.issues[0]?.message);
    if (!parsed.success) return;
    try {
      await how(parsed.data);
      setReason('');
    } catch (error) {
      setWhy(sentenceOf(error));
    }
  };
  return (
    <form
      className="mt-3 text-ink"
      onSubmit={(event) => {
        event.preventDefault();
        void submit(onReason);
      }}
    >
      <label htmlFor={id} className="block font-semibold">
        {label}
      </label>
      <textarea
        id={id}
        rows={2}
        value={reason}
        onChange={(event) => setReason(event.target.value)}
        aria-invalid={why !== undefined}
        aria-describedby={`${id}-why`}
        className={fieldClass(why !== undefined, 'mt-1')}
      />
      <FieldError id={`${id}-why`} message={why} />
      <div className="mt-2 flex flex-wrap gap-2.5">
        <Button type="submit" size="large" disabled={busy}>
          {action}
        </Button>
        {other && (
          <Button
            size="large"
            look="quiet"
            disabled={busy}
            onClick={() => void submit(other.onReason)}
          >
            {other.action}
          </Button>
        )}
      </div>
    </form>
  );
}
