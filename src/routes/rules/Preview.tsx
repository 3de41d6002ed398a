import type { LinkChange } from '#shared/chain/linkChanges.ts';
import { Card, CardTitle } from '../../components/ui/Card.tsx';
import { SayingPill } from './SayingPill.tsx';

/** What these rules would say of the links of the board, where that differs. */
export function Preview({ links }: { links: readonly LinkChange[] | null }) {
  return (
    <Card className="scroll-mt-4">
      <CardTitle>On this board</CardTitle>
      <div aria-live="polite" className="mt-2">
        {links === null ? (
          <p className="text-ink2">Mend the fields that are marked to see what would change.</p>
        ) : links.length === 0 ? (
          <p className="text-ink2">Nothing on this board changes.</p>
        ) : (
          <>
            <p>
              {links.length === 1 ? '1 link' : `${links.length} links`} would be judged otherwise:
            </p>
            <ul className="mt-3 space-y-3">
              {links.map((link) => (
                <Changed key={link.batchId} link={link} />
              ))}
            </ul>
          </>
        )}
      </div>
    </Card>
  );
}

function Changed({ link }: { link: LinkChange }) {
  return (
    <li className="border-t border-line pt-3">
      <p className="font-medium">Cake under {link.name}</p>
      <p className="mt-1.5 flex flex-wrap items-center gap-2">
        <SayingPill saying={link.from} />
        <span aria-hidden="true">→</span>
        <span className="sr-only">becomes</span>
        <SayingPill saying={link.to} />
      </p>
    </li>
  );
}
