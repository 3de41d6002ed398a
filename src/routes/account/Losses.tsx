import type { BreweryLoss } from '#shared/api/account.ts';
import { api } from '#shared/api/urls.ts';
import { buttonClass } from '../../components/ui/buttonClass.ts';
import { Notice } from '../../components/ui/Notice.tsx';
import { lossWords } from './lossWords.ts';

/** Breweries of which one is the only member go with the account; first a copy can be taken. */
export function Losses({ goes }: { goes: readonly BreweryLoss[] }) {
  if (goes.length === 0) return null;
  return (
    <>
      <Notice kind="hold">
        <p className="font-semibold">
          Nobody else belongs to {goes.length === 1 ? 'this brewery' : 'these breweries'}, so all of
          it is lost:
        </p>
        <ul className="mt-2 list-disc space-y-1 pl-5">
          {goes.map((loss) => (
            <li key={loss.id} className="wrap-anywhere">
              <b>{loss.name}</b>: {lossWords(loss)}.
            </li>
          ))}
        </ul>
      </Notice>
      <p>
        <a href={api.accountData} download className={buttonClass('plain')}>
          Download it first
        </a>
        <span className="mt-1.5 block text-small text-ink2">
          One file of JSON with everything listed above, and the record.
        </span>
      </p>
    </>
  );
}
