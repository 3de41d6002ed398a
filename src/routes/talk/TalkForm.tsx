import { useId, useState } from 'react';
import { LONGEST_COMMENT } from '#shared/api/comment.ts';
import { sentenceOf } from '../../api/errors.ts';
import { useUnsaved } from '../../app/unsaved.ts';
import { useOnline } from '../../app/useOnline.ts';
import { FieldError } from '../../components/form/FieldError.tsx';
import { fieldClass } from '../../components/form/fieldClass.ts';
import { Button } from '../../components/ui/Button.tsx';

interface TalkFormProps {
  label: string;
  action: string;
  first?: string;
  busy: boolean;
  error: Error | null;
  /** Resolves when it is said; what was typed stays where it fails. */
  onSend: (text: string) => Promise<unknown>;
  onCancel?: () => void;
}

/** One thing to say. Empty or too long is told at the field. */
export function TalkForm(props: TalkFormProps) {
  const { label, action, first = '', busy, error, onSend, onCancel } = props;
  const id = useId();
  const online = useOnline();
  const [text, setText] = useState(first);
  const [isTried, setTried] = useState(false);
  useUnsaved(text.trim() !== '' && text !== first && !busy);
  const why = isTried ? whyNot(text) : null;
  const message = why ?? (error ? sentenceOf(error) : undefined);
  const send = () => {
    setTried(true);
    if (whyNot(text) !== null) return;
    onSend(text.trim()).then(
      () => {
        setText('');
        setTried(false);
      },
      () => undefined,
    );
  };
  return (
    <form
      noValidate
      className="print:hidden"
      onSubmit={(event) => {
        event.preventDefault();
        send();
      }}
    >
      <label htmlFor={id} className="mb-1 block text-small font-semibold">
        {label}
      </label>
      <textarea
        id={id}
        rows={2}
        value={text}
        aria-invalid={message !== undefined}
        aria-describedby={message === undefined ? undefined : `${id}-why`}
        onChange={(event) => setText(event.target.value)}
        className={fieldClass(message !== undefined)}
      />
      <FieldError id={`${id}-why`} message={message} />
      <div className="mt-2 flex flex-wrap justify-end gap-2">
        {onCancel && (
          <Button size="small" look="quiet" onClick={onCancel}>
            Leave it
          </Button>
        )}
        <Button size="small" look="first" type="submit" disabled={busy || !online}>
          {action}
        </Button>
      </div>
    </form>
  );
}

function whyNot(text: string): string | null {
  const { length } = text.trim();
  if (length === 0) return 'Write something first';
  if (length <= LONGEST_COMMENT) return null;
  return `Use at most ${LONGEST_COMMENT} characters; these are ${length}`;
}
