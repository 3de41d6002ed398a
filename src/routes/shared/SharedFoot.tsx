import { useState } from 'react';
import type { SharedChain } from '#shared/api/share.ts';
import { formatDay } from '#shared/units/day.ts';
import { useSession } from '../../api/session.ts';
import { Button } from '../../components/ui/Button.tsx';
import { LinkButton } from '../../components/ui/LinkButton.tsx';
import { CopyDialog } from './CopyDialog.tsx';

/** What can be done with the chain, and until when the link works. */
export function SharedFoot({ shared, token }: { shared: SharedChain; token: string }) {
  const { data: me } = useSession();
  const [isAsked, setAsked] = useState(false);
  const here = encodeURIComponent(`/shared/${token}`);
  const mayCopy = me?.breweries.some(({ role }) => role !== 'taster') ?? false;
  return (
    <footer className="sticky bottom-0 z-20 border-t border-line bg-paper px-[22px] pt-3.5 pb-4">
      <div className="mx-auto flex max-w-[1036px] flex-wrap items-center gap-x-5 gap-y-2">
        {mayCopy && (
          <Button look="first" size="large" onClick={() => setAsked(true)}>
            Copy into my brewery
          </Button>
        )}
        {me === null && (
          <LinkButton look="first" size="large" to={`/sign-in?next=${here}`}>
            Sign in to copy it
          </LinkButton>
        )}
        <p className="text-body text-ink2">
          Works until {formatDay(shared.until)}. Shows this chain only.
        </p>
      </div>
      {isAsked && me && (
        <CopyDialog
          me={me}
          token={token}
          name={shared.chain.name}
          onClose={() => setAsked(false)}
        />
      )}
    </footer>
  );
}
