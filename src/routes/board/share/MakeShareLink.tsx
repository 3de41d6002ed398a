import { useState } from 'react';
import { useForm } from 'react-hook-form';
import type { Chain } from '#shared/api/chain.ts';
import { shareLinkRequest, type ShareLinkMade } from '#shared/api/share.ts';
import { addDays, formatDay } from '#shared/units/day.ts';
import { useMakeShareLink } from '../../../api/share.ts';
import { newId } from '../../../app/newId.ts';
import { contractResolver } from '../../../components/form/contractResolver.ts';
import { Form } from '../../../components/form/Form.tsx';
import { Button } from '../../../components/ui/Button.tsx';
import { LinkOnce } from '../../../components/ui/LinkOnce.tsx';
import { useBoardView } from '../view/BoardView.tsx';
import { ShareLinkFields } from './ShareLinkFields.tsx';

const contract = shareLinkRequest.omit({ id: true });
const USUAL_DAYS = 30;

/** A button, then the form, then the link this once. */
export function MakeShareLink({ chain }: { chain: Chain }) {
  const [isOpen, setOpen] = useState(false);
  const [made, setMade] = useState<ShareLinkMade | null>(null);
  if (made)
    return (
      <div className="mt-4">
        <LinkOnce
          label={`Link: ${made.name}`}
          address={`${location.origin}/shared/${made.token}`}
          onDone={() => setMade(null)}
        >
          It is shown this once and works until the end of {formatDay(made.expiresOn)}. Whoever has
          it sees this chain, so pass it on with care.
        </LinkOnce>
      </div>
    );
  if (!isOpen)
    return (
      <Button look="first" className="mt-4" onClick={() => setOpen(true)}>
        Make a link
      </Button>
    );
  return (
    <LinkForm
      chain={chain}
      onCancel={() => setOpen(false)}
      onMade={(link) => {
        setOpen(false);
        setMade(link);
      }}
    />
  );
}

interface LinkFormProps {
  chain: Chain;
  onCancel: () => void;
  onMade: (link: ShareLinkMade) => void;
}

function LinkForm({ chain, onCancel, onMade }: LinkFormProps) {
  const { slug, board } = useBoardView();
  const make = useMakeShareLink(slug, chain.id);
  // One id for one form: asked again after a lost answer, it makes the same link.
  const [id] = useState(newId);
  const form = useForm({
    resolver: contractResolver(contract),
    defaultValues: { name: '', expiresOn: addDays(board.today, USUAL_DAYS), showPrices: false },
  });
  return (
    <div className="mt-4">
      <Form
        form={form}
        action="Make the link"
        busyAction="Making it"
        onCancel={onCancel}
        onSubmit={async (facts) => onMade(await make.mutateAsync({ id, ...facts }))}
      >
        <ShareLinkFields />
      </Form>
    </div>
  );
}
