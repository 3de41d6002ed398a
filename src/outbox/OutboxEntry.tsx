import { useState } from 'react';
import { Button } from '../components/ui/Button.tsx';
import { ConfirmDialog } from '../components/ui/ConfirmDialog.tsx';
import { TextLink } from '../components/ui/TextLink.tsx';
import { asOf } from '../kept/asOf.ts';
import type { Entry } from './entry.ts';
import { outbox } from './outbox.ts';
import { Refused } from './Refused.tsx';

export function OutboxEntry({ entry, isBehind }: { entry: Entry; isBehind: boolean }) {
  const [isAsking, setAsking] = useState(false);
  const written = `Written ${asOf(Date.parse(entry.madeAt))}`;
  return (
    <li className="rounded-card border-[1.5px] border-line bg-white p-4">
      <p className="font-semibold wrap-anywhere">{entry.what}</p>
      <p className="text-small text-ink2">
        {isBehind ? `${written}; waits behind the one above.` : `${written}.`}
      </p>
      {entry.refusal && <Refused entry={entry} />}
      <div className="mt-2 flex flex-wrap items-center gap-x-4 gap-y-2">
        <TextLink to={entry.page}>To its page</TextLink>
        {entry.refusal?.kind !== 'changed-since' && (
          <Button look="text" size="small" onClick={() => setAsking(true)}>
            Discard
          </Button>
        )}
      </div>
      <ConfirmDialog
        open={isAsking}
        onClose={() => setAsking(false)}
        title="Discard this entry?"
        action="Discard it"
        worksOffline
        onConfirm={() => {
          setAsking(false);
          void outbox.discard(entry.id);
        }}
      >
        <p>{entry.what}</p>
        <p>It was never sent. Nobody can bring it back.</p>
      </ConfirmDialog>
    </li>
  );
}
