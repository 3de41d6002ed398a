import { Fragment } from 'react';
import { CONTRACT } from '#shared/api/contract.ts';
import { Button } from '../components/ui/Button.tsx';
import { Notice } from '../components/ui/Notice.tsx';
import { asWritten, bothVersions } from './bothVersions.ts';
import type { Entry } from './entry.ts';
import { outbox } from './outbox.ts';

/** Why an entry was not taken, what stands on the server instead, and the choice. */
export function Refused({ entry }: { entry: Entry }) {
  const rows = bothVersions(entry);
  const isChanged = entry.refusal?.kind === 'changed-since';
  const hasEnded = entry.refusal?.kind === 'contract-ended';
  return (
    <div className="mt-3 space-y-3">
      <Notice kind="mind" alert>
        {hasEnded
          ? 'This was written with an earlier version of the page. The server takes nothing from it any more.'
          : entry.refusal?.sentence}
        {entry.refusal?.errors.map(({ detail, pointer }) => (
          <span key={pointer} className="block">
            {detail}
          </span>
        ))}
      </Notice>
      {rows.length > 0 && <Versions rows={rows} />}
      {hasEnded && <WriteAgain entry={entry} />}
      <div className="flex flex-wrap gap-3">
        {!hasEnded && (
          <Button
            look="first"
            size="small"
            onClick={() => void outbox.retry(entry.id, isChanged ? 'over-theirs' : 'as-it-was')}
          >
            {isChanged ? 'Mine shall stand' : 'Try again'}
          </Button>
        )}
        {isChanged && (
          <Button look="quiet" size="small" onClick={() => void outbox.discard(entry.id)}>
            Leave theirs
          </Button>
        )}
      </div>
    </div>
  );
}

/** What an old page wrote is never taken, however often it is sent: what it was, to write it anew. */
function WriteAgain({ entry }: { entry: Entry }) {
  return (
    <>
      <dl className="grid grid-cols-[auto_1fr] gap-x-4 gap-y-1 text-small">
        {asWritten(entry).map(({ label, mine }) => (
          <Fragment key={label}>
            <dt className="text-ink2">{label}</dt>
            <dd className="wrap-anywhere whitespace-pre-wrap">{mine}</dd>
          </Fragment>
        ))}
      </dl>
      {entry.contract === CONTRACT ? (
        <>
          <p>Reload the page, write it again there, then discard it here.</p>
          <Button look="first" size="small" onClick={() => location.reload()}>
            Reload the page
          </Button>
        </>
      ) : (
        <p>
          Write it again on its page, then discard it here. What was written after it goes on then.
        </p>
      )}
    </>
  );
}

function Versions({ rows }: { rows: ReturnType<typeof bothVersions> }) {
  return (
    <table className="w-full text-left text-small">
      <thead>
        <tr className="text-ink2">
          <th scope="col" className="py-1 pr-3 font-medium">
            What
          </th>
          <th scope="col" className="py-1 pr-3 font-medium">
            Mine
          </th>
          <th scope="col" className="py-1 font-medium">
            On the server
          </th>
        </tr>
      </thead>
      <tbody>
        {rows.map(({ label, mine, theirs }) => (
          <tr key={label} className="border-t border-line align-top">
            <th scope="row" className="py-1.5 pr-3 font-medium">
              {label}
            </th>
            <td className="py-1.5 pr-3 wrap-anywhere">{mine}</td>
            <td className="py-1.5 wrap-anywhere">{theirs}</td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}
