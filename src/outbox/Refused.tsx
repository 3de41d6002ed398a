import { Button } from '../components/ui/Button.tsx';
import { Notice } from '../components/ui/Notice.tsx';
import { bothVersions } from './bothVersions.ts';
import type { Entry } from './entry.ts';
import { outbox } from './outbox.ts';

/** Why an entry was not taken, what stands on the server instead, and the choice. */
export function Refused({ entry }: { entry: Entry }) {
  const rows = bothVersions(entry);
  const isChanged = entry.refusal?.kind === 'changed-since';
  return (
    <div className="mt-3 space-y-3">
      <Notice kind="mind" alert>
        {entry.refusal?.sentence}
        {entry.refusal?.errors.map(({ detail, pointer }) => (
          <span key={pointer} className="block">
            {detail}
          </span>
        ))}
      </Notice>
      {rows.length > 0 && <Versions rows={rows} />}
      <div className="flex flex-wrap gap-3">
        {entry.refusal?.kind === 'contract-ended' ? (
          <Button look="first" size="small" onClick={() => location.reload()}>
            Reload the page
          </Button>
        ) : (
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
