import { useQuery } from '@tanstack/react-query';
import { boardQuery } from '../../api/board.ts';
import { lastChangeQuery } from '../../api/lastChange.ts';
import { useSession } from '../../api/session.ts';
import { useBrewery } from '../../app/useBrewery.ts';
import { Notice } from '../ui/Notice.tsx';

export interface ChangedElsewhereProps {
  /** As it is now. */
  row: { id: string; version: number };
  /** Names of the fields that somebody changed since the form was opened. */
  labels: readonly string[];
}

/** A quiet word beside an open form: it touches none of the fields. */
export function ChangedElsewhere({ row, labels }: ChangedElsewhereProps) {
  return (
    <div role="status" className="empty:hidden">
      {labels.length > 0 && (
        <Notice kind="mind">
          <Who row={row} /> changed this while you were writing: {labels.join(', ')}. What you wrote
          is untouched; where you both changed a field you choose when you save.
        </Notice>
      )}
    </div>
  );
}

/** Instead, where the row is no longer there to be saved. */
export function DeletedElsewhere({ row }: Pick<ChangedElsewhereProps, 'row'>) {
  return (
    <Notice kind="hold" alert>
      <Who row={{ ...row, version: row.version + 1 }} /> deleted this while you were writing. It
      cannot be saved any more; what you wrote is still here to copy.
    </Notice>
  );
}

function Who({ row }: Pick<ChangedElsewhereProps, 'row'>) {
  const { slug } = useBrewery();
  const me = useSession().data?.id;
  const { data: seasonId } = useQuery({ ...boardQuery(slug), select: (board) => board.season.id });
  const { data: who } = useQuery({
    ...lastChangeQuery(slug, seasonId ?? '', row),
    enabled: seasonId !== undefined,
  });
  if (!who) return 'Somebody';
  return who.id === me ? 'You, in another window,' : who.name;
}
