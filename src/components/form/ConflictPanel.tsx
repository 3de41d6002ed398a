import { useState } from 'react';
import { flushSync } from 'react-dom';
import { sentenceOf } from '../../api/errors.ts';
import { useOnline } from '../../app/useOnline.ts';
import { useUnsaved } from '../../app/unsaved.ts';
import { Button } from '../ui/Button.tsx';
import { Notice } from '../ui/Notice.tsx';
import type { Conflict } from './useRowEdit.ts';

export interface ConflictPanelProps<Facts> {
  conflict: Conflict<Facts>;
  labelOf: (key: keyof Facts) => string;
  /** A value in words, with its unit. */
  wordsOf: (key: keyof Facts, facts: Partial<Facts>) => string;
  onResolve: (theirKeys: (keyof Facts)[]) => Promise<void>;
  onBack: () => void;
}

/** Somebody saved first: both values of each field that both changed, to choose from. */
export function ConflictPanel<Facts>(props: ConflictPanelProps<Facts>) {
  const { conflict, labelOf, wordsOf, onResolve, onBack } = props;
  const [theirs, setTheirs] = useState<ReadonlySet<keyof Facts>>(new Set());
  const [failure, setFailure] = useState<string | null>(null);
  const [busy, setBusy] = useState(false);
  const online = useOnline();
  useUnsaved(!busy);
  const choose = (key: keyof Facts, isTheirs: boolean) => {
    const next = new Set(theirs);
    if (isTheirs) next.add(key);
    else next.delete(key);
    setTheirs(next);
  };
  const save = async () => {
    // Where theirs stands everywhere there is nothing to send: the way out is asked for at once, and
    // must not find anything unsaved.
    flushSync(() => setBusy(true));
    setFailure(null);
    await onResolve([...theirs]).catch((error: unknown) => setFailure(sentenceOf(error)));
    setBusy(false);
  };
  return (
    <div className="space-y-4">
      <Notice kind="mind" alert>
        Somebody saved other values while you were writing. Choose which shall stand; everything
        else of yours is kept.
      </Notice>
      {conflict.keys.map((key) => (
        <Choice
          key={String(key)}
          label={labelOf(key)}
          mine={wordsOf(key, conflict.mine)}
          theirs={wordsOf(key, conflict.theirs as Partial<Facts>)}
          isTheirs={theirs.has(key)}
          onChoose={(isTheirs) => choose(key, isTheirs)}
        />
      ))}
      {failure && <Notice kind="hold">{failure}</Notice>}
      <div className="flex flex-wrap justify-end gap-3">
        <Button look="quiet" onClick={onBack}>
          Back to the form
        </Button>
        <Button look="first" disabled={busy || !online} onClick={save}>
          Save what I chose
        </Button>
      </div>
    </div>
  );
}

interface ChoiceProps {
  label: string;
  mine: string;
  theirs: string;
  isTheirs: boolean;
  onChoose: (isTheirs: boolean) => void;
}

function Choice({ label, mine, theirs, isTheirs, onChoose }: ChoiceProps) {
  const option = (words: string, whose: string, value: boolean) => (
    <label className="flex min-h-11 items-start gap-2.5 rounded-field border-[1.5px] border-edge bg-white px-3 py-2.5 has-checked:border-bottle has-checked:bg-bottle-l">
      <input
        type="radio"
        name={label}
        className="mt-0.5 size-5 shrink-0 accent-bottle"
        checked={isTheirs === value}
        onChange={() => onChoose(value)}
      />
      <span className="min-w-0 wrap-anywhere">
        <span className="font-semibold">{whose}: </span>
        {words}
      </span>
    </label>
  );
  return (
    <fieldset>
      <legend className="mb-1 font-semibold">{label}</legend>
      <div className="grid gap-2 tablet:grid-cols-2">
        {option(mine, 'Mine', false)}
        {option(theirs, 'Theirs', true)}
      </div>
    </fieldset>
  );
}
