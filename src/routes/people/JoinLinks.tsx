import { useQuery } from '@tanstack/react-query';
import { sentenceOf } from '../../api/errors.ts';
import { joinLinksQuery } from '../../api/members.ts';
import { useBrewery } from '../../app/useBrewery.ts';
import { Card, CardTitle } from '../../components/ui/Card.tsx';
import { Notice } from '../../components/ui/Notice.tsx';
import { MakeJoinLink } from './MakeJoinLink.tsx';
import { OpenJoinLink } from './OpenJoinLink.tsx';

/** Asking somebody in: a link that is passed on by hand. */
export function JoinLinks() {
  const { slug } = useBrewery();
  const links = useQuery(joinLinksQuery(slug));
  const open = links.data?.filter((link) => link.usedAt === null) ?? [];
  return (
    <div className="mt-8 grid items-start gap-4 wide:grid-cols-2">
      <Card>
        <CardTitle>Ask somebody in</CardTitle>
        <p className="mt-1 mb-4 text-ink2">
          Make a link and pass it on yourself, by message or on paper. It is good for one person and
          seven days.
        </p>
        <MakeJoinLink />
      </Card>
      <Card>
        <CardTitle>Open links</CardTitle>
        {links.error && <Notice kind="hold">{sentenceOf(links.error)}</Notice>}
        {open.length === 0 ? (
          <p className="mt-1 text-ink2">No link is waiting to be used.</p>
        ) : (
          <ul className="mt-3 space-y-3">
            {open.map((link) => (
              <OpenJoinLink key={link.id} link={link} />
            ))}
          </ul>
        )}
      </Card>
    </div>
  );
}
