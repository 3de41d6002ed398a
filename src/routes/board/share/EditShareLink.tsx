import { useState } from 'react';
import { shareLink as linkContract, shareLinkRequest, type ShareLink } from '#shared/api/share.ts';
import { formatDay } from '#shared/units/day.ts';
import { useEditShareLink } from '../../../api/share.ts';
import { RowForm } from '../../../components/form/RowForm.tsx';
import { Dialog } from '../../../components/ui/Dialog.tsx';
import { say } from '../../../components/ui/Toast.tsx';
import { useBoardView } from '../view/BoardView.tsx';
import { ShareLinkFields } from './ShareLinkFields.tsx';

const LABELS: Record<string, string> = {
  name: 'Whom or what it is for',
  expiresOn: 'Works until',
  showPrices: 'Show what the yeast costs',
};

interface EditShareLinkProps {
  link: ShareLink;
  chainId: string;
  onClose: () => void;
}

/** Its name, its end, and whether it tells prices; the address of the link stays. */
export function EditShareLink({ link, chainId, onClose }: EditShareLinkProps) {
  const { slug } = useBoardView();
  const edit = useEditShareLink(slug, chainId);
  const [values] = useState(() => {
    const { id, name, expiresOn, showPrices } = link;
    return { id, name, expiresOn, showPrices };
  });
  return (
    <Dialog open onClose={onClose} title={`Edit the link ${link.name}`}>
      <RowForm
        row={link}
        rowSchema={linkContract}
        contract={shareLinkRequest}
        keepsTyped={false}
        values={values}
        create={() => Promise.resolve()}
        patch={edit.mutateAsync}
        labelOf={(key) => LABELS[key] ?? key}
        wordsOf={(key, { name = '', expiresOn = '', showPrices }) =>
          key === 'name'
            ? name
            : key === 'expiresOn'
              ? formatDay(expiresOn)
              : showPrices
                ? 'yes'
                : 'no'
        }
        action="Save"
        onCancel={onClose}
        onDone={() => {
          say('The link is saved.');
          onClose();
        }}
      >
        <ShareLinkFields />
      </RowForm>
    </Dialog>
  );
}
