import { useState } from 'react';
import type { Chain } from '#shared/api/chain.ts';
import { GUEST_ROLES, type GuestRole } from '#shared/api/guest.ts';
import { sentenceOf } from '../../../api/errors.ts';
import { useInviteGuest } from '../../../api/guests.ts';
import { newId } from '../../../app/newId.ts';
import { useOnline } from '../../../app/useOnline.ts';
import { ROLE_WORDS } from '../../../app/words.ts';
import { dayAndTime } from '../../../app/zonedTime.ts';
import { Button } from '../../../components/ui/Button.tsx';
import { LinkOnce } from '../../../components/ui/LinkOnce.tsx';
import { Notice } from '../../../components/ui/Notice.tsx';
import { OFFLINE_SENTENCE } from '../../../components/ui/offlineSentence.ts';
import { useBoardView } from '../view/BoardView.tsx';
import { GUEST_WORDS } from './guestWords.ts';

/** As what, then the invitation this once. */
export function InviteGuest({ chain }: { chain: Chain }) {
  const { slug, board } = useBoardView();
  const [role, setRole] = useState<GuestRole>('brewer');
  const invite = useInviteGuest(slug, chain.id);
  const online = useOnline();
  if (invite.data)
    return (
      <div className="mt-4">
        <LinkOnce
          label={`Invitation for a guest ${invite.data.role}`}
          address={`${location.origin}/guest/${invite.data.token}`}
          onDone={() => invite.reset()}
        >
          It is shown this once, is good for one person and ends on{' '}
          {dayAndTime(invite.data.expiresAt, board.brewery.timeZone)}.
        </LinkOnce>
      </div>
    );
  return (
    <div className="mt-4 space-y-4">
      <fieldset className="space-y-1">
        <legend className="mb-1 font-semibold">They come to this chain as</legend>
        {GUEST_ROLES.map((value) => (
          <label key={value} className="flex min-h-11 items-start gap-2.5 py-1.5">
            <input
              type="radio"
              name="guest-role"
              checked={role === value}
              onChange={() => setRole(value)}
              className="mt-0.5 size-5 shrink-0 accent-bottle"
            />
            <span>
              <span className="font-medium">{ROLE_WORDS[value]}.</span>{' '}
              <span className="text-ink2">{GUEST_WORDS[value]}</span>
            </span>
          </label>
        ))}
      </fieldset>
      {invite.error && (
        <Notice kind="hold" alert>
          {sentenceOf(invite.error)}
        </Notice>
      )}
      {!online && <Notice kind="mind">{OFFLINE_SENTENCE}</Notice>}
      <Button
        look="first"
        disabled={!online || invite.isPending}
        onClick={() => invite.mutate({ id: newId(), role })}
      >
        Invite a guest
      </Button>
    </div>
  );
}
