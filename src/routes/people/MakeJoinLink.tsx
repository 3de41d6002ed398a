import { useState } from 'react';
import type { Role } from '#shared/api/people.ts';
import { sentenceOf } from '../../api/errors.ts';
import { useMakeJoinLink } from '../../api/members.ts';
import { newId } from '../../app/newId.ts';
import { useBrewery } from '../../app/useBrewery.ts';
import { useOnline } from '../../app/useOnline.ts';
import { Button } from '../../components/ui/Button.tsx';
import { Notice } from '../../components/ui/Notice.tsx';
import { OFFLINE_SENTENCE } from '../../components/ui/offlineSentence.ts';
import { MadeLink } from './MadeLink.tsx';
import { RoleChoice } from './RoleChoice.tsx';

export function MakeJoinLink() {
  const { slug } = useBrewery();
  const [role, setRole] = useState<Role>('brewer');
  const make = useMakeJoinLink(slug);
  const online = useOnline();
  if (make.data) return <MadeLink link={make.data} onDone={() => make.reset()} />;
  return (
    <div className="space-y-4">
      <RoleChoice legend="They come in as" role={role} onChoose={setRole} />
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
