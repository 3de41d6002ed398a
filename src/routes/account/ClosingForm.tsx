import { useId, useState, type FormEvent } from 'react';
import { useCloseAccount } from '../../api/account.ts';
import { useOnline } from '../../app/useOnline.ts';
import { fieldState } from '../../components/form/fieldState.ts';
import { PasswordBox } from '../../components/form/PasswordBox.tsx';
import { sortErrors } from '../../components/form/sortErrors.ts';
import { Button } from '../../components/ui/Button.tsx';
import { Notice } from '../../components/ui/Notice.tsx';
import { OFFLINE_SENTENCE } from '../../components/ui/offlineSentence.ts';

interface ClosingFormProps {
  /** Ids of the breweries of which it was said that they go. */
  losing: string[];
  onClose: () => void;
}

export function ClosingForm({ losing, onClose }: ClosingFormProps) {
  const close = useCloseAccount();
  const online = useOnline();
  const id = useId();
  const [password, setPassword] = useState('');
  const { fields, rest } = close.error
    ? sortErrors(close.error, ['password'])
    : { fields: [], rest: null };
  const submit = (event: FormEvent) => {
    event.preventDefault();
    close.mutate({ password, losing });
  };
  return (
    <form noValidate onSubmit={submit} className="space-y-4">
      <PasswordBox
        label="Your password"
        name="password"
        autoComplete="current-password"
        value={password}
        onChange={(event) => setPassword(event.target.value)}
        state={fieldState(id, fields[0]?.detail, false)}
      />
      <div className="space-y-3 empty:hidden" aria-live="assertive">
        {rest && <Notice kind="hold">{rest}</Notice>}
        {!online && <Notice kind="mind">{OFFLINE_SENTENCE}</Notice>}
      </div>
      <div className="flex flex-wrap justify-end gap-3">
        <Button look="quiet" onClick={onClose}>
          Keep the account
        </Button>
        <Button type="submit" look="danger" disabled={!online || close.isPending}>
          {close.isPending ? 'Closing it' : 'Close the account'}
        </Button>
      </div>
    </form>
  );
}
