import type { LinkSaying } from '#shared/chain/linkChanges.ts';
import { VerdictPill } from '../../components/drawn/VerdictPill.tsx';

/** A link's verdict with its worst reason; no link at all in words. */
export function SayingPill({ saying }: { saying: LinkSaying | null }) {
  if (!saying) return <span className="text-small text-ink2">no link</span>;
  return (
    <span className="inline-flex flex-wrap items-center gap-x-2 gap-y-1">
      <VerdictPill verdict={saying.verdict} />
      {saying.reason && <span className="text-small text-ink2">{saying.reason}</span>}
    </span>
  );
}
