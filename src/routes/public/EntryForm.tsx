import { createContext, use, useId, useState, type FormEvent, type ReactNode } from 'react';
import { reportClientError } from '../../api/clientErrors.ts';
import { fieldState, type FieldState } from '../../components/form/fieldState.ts';
import { FormFoot } from '../../components/form/FormFoot.tsx';
import { sortErrors } from '../../components/form/sortErrors.ts';
import { judged, textsOf, type EntryContract, type Faults } from './entry.ts';

const EntryFaults = createContext<Faults>({});

/** One field of the form around it. */
export function useEntryField(name: string, hasHint: boolean): FieldState {
  const own = useId();
  return fieldState(own, use(EntryFaults)[name], hasHint);
}

export interface EntryFormProps<O> {
  contract: EntryContract<O>;
  action: string;
  busyAction: string;
  /** What it throws is shown in the form; what was typed stays. */
  onSubmit: (values: O) => Promise<unknown>;
  children: ReactNode;
}

/**
 * A short form of a page that anyone may open, judged by its route's contract. It does without the
 * forms of the signed-in pages, which weigh more than the rest of such a page.
 */
export function EntryForm<O>({ contract, onSubmit, children, ...words }: EntryFormProps<O>) {
  const [faults, setFaults] = useState<Faults | null>(null);
  const [failure, setFailure] = useState<string | null>(null);
  const [busy, setBusy] = useState(false);
  const refuse = (form: HTMLFormElement, found: Faults) => {
    setFaults(found);
    const first = Object.keys(textsOf(form)).find((name) => found[name] !== undefined);
    form.querySelector<HTMLElement>(`[name="${first}"]`)?.focus();
  };
  const submit = async (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    const form = event.currentTarget;
    const texts = textsOf(form);
    const answer = judged(contract, texts);
    setFailure(null);
    if (!answer.ok) return refuse(form, answer.faults);
    setFaults({});
    setBusy(true);
    try {
      await onSubmit(answer.values);
    } catch (error) {
      reportClientError(error, location.pathname);
      const { fields, rest } = sortErrors(error, Object.keys(texts));
      refuse(form, Object.fromEntries(fields.map(({ path, detail }) => [path, detail])));
      setFailure(rest);
    }
    setBusy(false);
  };
  // Once something was refused, it is judged anew at each key.
  const again = (event: FormEvent<HTMLFormElement>) => {
    if (faults === null) return;
    const answer = judged(contract, textsOf(event.currentTarget));
    setFaults(answer.ok ? {} : answer.faults);
  };
  return (
    <form noValidate onSubmit={submit} onInput={again} className="space-y-5">
      <EntryFaults value={faults ?? {}}>{children}</EntryFaults>
      <FormFoot {...words} wide messages={Object.values(faults ?? {})} {...{ failure, busy }} />
    </form>
  );
}
