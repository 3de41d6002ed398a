import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import type { ListedSeason } from '#shared/api/brewery.ts';
import { sentenceOf } from '../../../api/errors.ts';
import { seasonsQuery } from '../../../api/seasons.ts';
import { useBrewery } from '../../../app/useBrewery.ts';
import { useOnline } from '../../../app/useOnline.ts';
import { Button } from '../../../components/ui/Button.tsx';
import { Card, CardTitle } from '../../../components/ui/Card.tsx';
import { Notice } from '../../../components/ui/Notice.tsx';
import { Skeleton } from '../../../components/ui/Skeleton.tsx';
import { NewSeasonDialog } from './NewSeasonDialog.tsx';
import { SeasonRow } from './SeasonRow.tsx';

interface SeasonListProps {
  /** Id of the season that the page is about. */
  shown: string;
  mayEdit: boolean;
}

/** All seasons of the brewery: the current one first, the archived folded away. */
export function SeasonList({ shown, mayEdit }: SeasonListProps) {
  const { slug } = useBrewery();
  const seasons = useQuery(seasonsQuery(slug));
  const online = useOnline();
  const [isMaking, setMaking] = useState(false);
  const all = seasons.data ?? [];
  const archived = all.filter(({ isArchived }) => isArchived);
  return (
    <Card>
      <div className="flex flex-wrap items-center justify-between gap-3">
        <CardTitle>All seasons</CardTitle>
        {mayEdit && (
          <Button disabled={!online} onClick={() => setMaking(true)}>
            New season
          </Button>
        )}
      </div>
      {seasons.isPending && <Skeleton label="Loading the seasons" />}
      {seasons.error && <Notice kind="hold">{sentenceOf(seasons.error)}</Notice>}
      <Rows
        label="Seasons"
        seasons={all.filter((one) => !one.isArchived)}
        {...{ shown, mayEdit }}
      />
      {archived.length > 0 && (
        <details className="mt-3" open={archived.some(({ id }) => id === shown) || undefined}>
          <summary className="min-h-9 cursor-pointer py-1.5 font-semibold max-tablet:min-h-11">
            Archive, {archived.length}
          </summary>
          <Rows label="Archived seasons" seasons={archived} {...{ shown, mayEdit }} />
        </details>
      )}
      {isMaking && <NewSeasonDialog onClose={() => setMaking(false)} />}
    </Card>
  );
}

interface RowsProps extends SeasonListProps {
  label: string;
  seasons: readonly ListedSeason[];
}

const Rows = ({ label, seasons, shown, mayEdit }: RowsProps) => (
  <ul aria-label={label} className="mt-2 divide-y divide-line empty:hidden">
    {seasons.map((season) => (
      <SeasonRow key={season.id} season={season} isShown={season.id === shown} mayEdit={mayEdit} />
    ))}
  </ul>
);
