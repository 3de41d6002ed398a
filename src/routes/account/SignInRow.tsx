import type { SignInPlace } from '#shared/api/account.ts';
import { dayAndTime } from '../../app/zonedTime.ts';
import { Button } from '../../components/ui/Button.tsx';

interface SignInRowProps {
  place: SignInPlace;
  busy: boolean;
  onEnd: () => void;
}

/** Times are those of the device that is looked at. */
export function SignInRow({ place, busy, onEnd }: SignInRowProps) {
  const { timeZone } = Intl.DateTimeFormat().resolvedOptions();
  return (
    <li className="flex items-center gap-3 py-3">
      <div className="min-w-0 grow">
        <p className="font-medium wrap-anywhere">{place.device || 'A browser'}</p>
        <p className="text-small text-ink2">
          {place.isThisOne ? 'This one' : `Last seen ${dayAndTime(place.seenAt, timeZone)}`} ·
          signed in {dayAndTime(place.since, timeZone)}
        </p>
      </div>
      {!place.isThisOne && (
        <Button
          size="small"
          look="quiet"
          disabled={busy}
          aria-label={`Sign out: ${place.device}`}
          onClick={onEnd}
        >
          Sign out
        </Button>
      )}
    </li>
  );
}
