import { useState, type ReactNode } from 'react';
import { fieldClass } from '../form/fieldClass.ts';
import { Button } from './Button.tsx';

interface LinkOnceProps {
  label: string;
  address: string;
  /** That it is shown once, when it ends, and what it opens. */
  children: ReactNode;
  onDone: () => void;
}

/** A link with a secret in it, the one time that it can be seen. */
export function LinkOnce({ label, address, children, onDone }: LinkOnceProps) {
  const [copied, setCopied] = useState<'yes' | 'no' | null>(null);
  const copy = async () => {
    const done = await navigator.clipboard
      ?.writeText(address)
      .then(() => true)
      .catch(() => false);
    setCopied(done ? 'yes' : 'no');
  };
  return (
    <div className="space-y-3">
      <label className="block font-semibold" htmlFor="made-link">
        {label}
      </label>
      <input
        id="made-link"
        readOnly
        value={address}
        onFocus={(event) => event.target.select()}
        className={fieldClass(false)}
      />
      <p className="text-small text-ink2">{children}</p>
      <div className="flex flex-wrap gap-3">
        <Button look="first" onClick={copy}>
          Copy the link
        </Button>
        <Button look="quiet" onClick={onDone}>
          Done
        </Button>
      </div>
      <p role="status" className="min-h-5 text-small font-medium">
        {copied === 'yes' && 'Copied.'}
        {copied === 'no' && 'This browser would not copy it: select the text above instead.'}
      </p>
    </div>
  );
}
