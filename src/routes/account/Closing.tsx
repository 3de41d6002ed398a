import { useQuery } from '@tanstack/react-query';
import type { ClosingPreview } from '#shared/api/account.ts';
import { closingQuery } from '../../api/account.ts';
import { sentenceOf } from '../../api/errors.ts';
import { Notice } from '../../components/ui/Notice.tsx';
import { Skeleton } from '../../components/ui/Skeleton.tsx';
import { TextLink } from '../../components/ui/TextLink.tsx';
import { ClosingForm } from './ClosingForm.tsx';
import { Losses } from './Losses.tsx';

/** What closing would do, as it stands now, before it is done. */
export function Closing({ onClose }: { onClose: () => void }) {
  const { data: preview, error } = useQuery(closingQuery);
  if (error) return <Notice kind="hold">{sentenceOf(error)}</Notice>;
  if (!preview) return <Skeleton rows={2} label="Looking at what would be lost" />;
  if (preview.heldBy.length > 0) return <HandOverFirst breweries={preview.heldBy} />;
  return (
    <div className="space-y-5">
      <Losses goes={preview.goes} />
      <Leaves breweries={preview.stays} />
      <p className="text-ink2">
        You are signed out everywhere, and your e-mail address is forgotten.
      </p>
      <ClosingForm losing={preview.goes.map(({ id }) => id)} onClose={onClose} />
    </div>
  );
}

function HandOverFirst({ breweries }: { breweries: ClosingPreview['heldBy'] }) {
  return (
    <>
      <Notice kind="hold">
        You are the only head brewer of {breweries.length === 1 ? 'a brewery' : 'breweries'} that
        others belong to. Hand over first, then close the account.
      </Notice>
      <ul className="mt-4 space-y-1">
        {breweries.map(({ slug, name }) => (
          <li key={slug}>
            <TextLink to={`/b/${slug}/people`} className="inline-block py-2">
              Hand over {name}
            </TextLink>
          </li>
        ))}
      </ul>
    </>
  );
}

function Leaves({ breweries }: { breweries: ClosingPreview['stays'] }) {
  if (breweries.length === 0) return null;
  return (
    <p>
      You leave <b>{breweries.map(({ name }) => name).join(', ')}</b>, which{' '}
      {breweries.length === 1 ? 'goes' : 'go'} on without you.
    </p>
  );
}
