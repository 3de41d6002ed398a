import { useState } from 'react';
import type { ShareLink } from '#shared/api/share.ts';
import { formatDay, formatDayShort } from '#shared/units/day.ts';
import { useWithdrawShareLink } from '../../../api/share.ts';
import { Button } from '../../../components/ui/Button.tsx';
import { ConfirmDialog } from '../../../components/ui/ConfirmDialog.tsx';
import { useBoardView } from '../view/BoardView.tsx';
import { count } from '../view/words.ts';
import { EditShareLink } from './EditShareLink.tsx';

/** "works until Fri 30 April", or why it does not any more. */
function endWords({ withdrawnAt, expiresOn }: ShareLink, today: string): string {
  if (withdrawnAt !== null) return 'withdrawn';
  return `${expiresOn < today ? 'ended' : 'works until'} ${formatDay(expiresOn)}`;
}

/** "opened 3 times, last on 29 Mar". */
function visitWords({ visits, lastVisitAt }: ShareLink): string {
  if (visits === 0) return 'not opened yet';
  const last = lastVisitAt === null ? '' : `, last on ${formatDayShort(lastVisitAt.slice(0, 10))}`;
  return `opened ${count(visits, 'time')}${last}`;
}

export function ShareLinkRow({ link, chainId }: { link: ShareLink; chainId: string }) {
  const { slug, board } = useBoardView();
  const withdraw = useWithdrawShareLink(slug, chainId);
  const [asked, setAsked] = useState<'edit' | 'withdraw' | null>(null);
  const close = () => setAsked(null);
  const facts = [
    endWords(link, board.today),
    visitWords(link),
    ...(link.showPrices ? ['with prices'] : []),
  ];
  return (
    <li className="flex items-center gap-3 py-2.5">
      <div className="min-w-0 grow">
        <p className="font-medium wrap-anywhere">{link.name}</p>
        <p className="text-small text-ink2">{facts.join(' · ')}</p>
        <p className="text-small text-ink2">
          Made by {link.createdBy} on {formatDayShort(link.createdOn)}
        </p>
      </div>
      {board.me.can.invite && link.withdrawnAt === null && (
        <div className="flex flex-wrap justify-end gap-2">
          <Button
            size="small"
            look="quiet"
            aria-label={`Edit ${link.name}`}
            onClick={() => setAsked('edit')}
          >
            Edit
          </Button>
          <Button
            size="small"
            look="quiet"
            aria-label={`Withdraw ${link.name}`}
            onClick={() => setAsked('withdraw')}
          >
            Withdraw
          </Button>
        </div>
      )}
      {asked === 'edit' && <EditShareLink link={link} chainId={chainId} onClose={close} />}
      <ConfirmDialog
        open={asked === 'withdraw'}
        onClose={close}
        title={`Withdraw the link ${link.name}?`}
        action="Withdraw the link"
        busy={withdraw.isPending}
        error={withdraw.error}
        onConfirm={() => withdraw.mutate(link.id, { onSuccess: close })}
      >
        <p>Whoever has it sees from now on only that it is no longer good.</p>
      </ConfirmDialog>
    </li>
  );
}
