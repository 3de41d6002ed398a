import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import type { Person } from '#shared/api/people.ts';
import { sentenceOf } from '../../api/errors.ts';
import { useCopyChain } from '../../api/share.ts';
import { newId } from '../../app/newId.ts';
import { useOnline } from '../../app/useOnline.ts';
import { BreweryChoice } from '../../components/form/BreweryChoice.tsx';
import { Button } from '../../components/ui/Button.tsx';
import { Dialog } from '../../components/ui/Dialog.tsx';
import { Notice } from '../../components/ui/Notice.tsx';
import { OFFLINE_SENTENCE } from '../../components/ui/offlineSentence.ts';
import { say } from '../../components/ui/Toast.tsx';

interface CopyDialogProps {
  me: Person;
  token: string;
  name: string;
  onClose: () => void;
}

/** Into which brewery: of several the one that is chosen. */
export function CopyDialog({ me, token, name, onClose }: CopyDialogProps) {
  const mine = me.breweries.filter(({ role }) => role !== 'taster').map((own) => own.brewery);
  const [slug, setSlug] = useState(mine[0]?.slug ?? '');
  const [id] = useState(newId);
  const copy = useCopyChain();
  const online = useOnline();
  const navigate = useNavigate();
  const run = () =>
    copy.mutate(
      { slug, id, token },
      {
        onSuccess: () => {
          void say(`${name} is on your board.`);
          void navigate(`/b/${slug}`);
        },
      },
    );
  return (
    <Dialog
      open
      onClose={onClose}
      title={`Copy ${name}`}
      lead="Its yeast, a new shelf and its batches, pencilled on the same days. What happens there later does not come along."
    >
      <BreweryChoice breweries={mine} chosen={slug} onChoose={setSlug} legend="Into" />
      <div className="mt-4 space-y-3" aria-live="polite">
        {copy.error && <Notice kind="hold">{sentenceOf(copy.error)}</Notice>}
        {!online && <Notice kind="mind">{OFFLINE_SENTENCE}</Notice>}
      </div>
      <div className="mt-5 flex flex-wrap justify-end gap-3">
        <Button look="quiet" onClick={onClose}>
          Leave it
        </Button>
        <Button look="first" disabled={!online || copy.isPending} onClick={run}>
          Copy it
        </Button>
      </div>
    </Dialog>
  );
}
