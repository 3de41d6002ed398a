import { useState } from 'react';
import { ROLES, type Role } from '#shared/api/people.ts';
import { sentenceOf } from '../../api/errors.ts';
import { useMakeJoinLink } from '../../api/members.ts';
import { newId } from '../../app/newId.ts';
import { useBrewery } from '../../app/useBrewery.ts';
import { useOnline } from '../../app/useOnline.ts';
import { ROLE_MEANING, ROLE_WORDS } from '../../app/words.ts';
import { Button } from '../../components/ui/Button.tsx';
import { Notice } from '../../components/ui/Notice.tsx';
import { OFFLINE_SENTENCE } from '../../components/ui/OfflineBanner.tsx';
import { MadeLink } from './MadeLink.tsx';

export function MakeJoinLink() {
  const { slug } = useBrewery();
  const [role, setRole] = useState<Role>('brewer');
  const make = useMakeJoinLink(slug);
  const online = useOnline();
  if (make.data) return <MadeLink link={make.data} onDone={() => make.reset()} />;
  return (
    <div className="space-y-4">
      <RoleChoice role={role} onChoose={setRole} />
      {make.error && (
        <Notice kind="hold" alert>
          {sentenceOf(make.error)}
        </Notice>
      )}
      {!online && <Notice kind="mind">{OFFLINE_SENTENCE}</Notice>}
      <Button
        look="first"
        disabled={!online || make.isPending}
        onClick={() => make.mutate({ id: newId(), role })}
      >
        Make a join link
      </Button>
    </div>
  );
}

function RoleChoice({ role, onChoose }: { role: Role; onChoose: (role: Role) => void }) {
  return (
    <fieldset className="space-y-1">
      <legend className="mb-1 font-semibold">They come in as</legend>
      {ROLES.map((value) => (
        <label key={value} className="flex min-h-11 items-start gap-2.5 py-1.5">
          <input
            type="radio"
            name="role"
            checked={role === value}
            onChange={() => onChoose(value)}
            className="mt-0.5 size-5 shrink-0 accent-bottle"
          />
          <span>
            <span className="font-medium">{ROLE_WORDS[value]}.</span>{' '}
            <span className="text-ink2">{ROLE_MEANING[value]}</span>
          </span>
        </label>
      ))}
    </fieldset>
  );
}
