import { useState } from 'react';
import type { JoinLinkMade } from '#shared/api/people.ts';
import { useBoard } from '../../api/board.ts';
import { ROLE_WORDS } from '../../app/words.ts';
import { fieldClass } from '../../components/form/fieldClass.ts';
import { Button } from '../../components/ui/Button.tsx';
import { endOf } from './endOf.ts';

/** The one time that the link can be seen. */
export function MadeLink({ link, onDone }: { link: JoinLinkMade; onDone: () => void }) {
  const { timeZone } = useBoard().brewery;
  const address = `${location.origin}/join/${link.token}`;
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
        Link for one {ROLE_WORDS[link.role].toLowerCase()}
      </label>
      <input
        id="made-link"
        readOnly
        value={address}
        onFocus={(event) => event.target.select()}
        className={fieldClass(false)}
      />
      <p className="text-small text-ink2">
        It is shown this once and ends on {endOf(link.expiresAt, timeZone)}. Whoever has it can come
        in, so pass it on with care.
      </p>
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
