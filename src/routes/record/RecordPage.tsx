import { useSearchParams } from 'react-router-dom';
import type { RecordEntry } from '#shared/api/record.ts';
import { formatDay } from '#shared/units/day.ts';
import { useBoard } from '../../api/board.ts';
import { sentenceOf } from '../../api/errors.ts';
import { useRecord } from '../../api/record.ts';
import { useBrewery } from '../../app/useBrewery.ts';
import { useTitle } from '../../app/useTitle.ts';
import { Button } from '../../components/ui/Button.tsx';
import { Notice } from '../../components/ui/Notice.tsx';
import { PageHead } from '../../components/ui/PageHead.tsx';
import { Skeleton } from '../../components/ui/Skeleton.tsx';
import { Page } from '../shell/Page.tsx';
import { byDay } from './byDay.ts';
import { Entry } from './Entry.tsx';
import { Filters } from './Filters.tsx';
import { filterOf, isFiltered } from './filter.ts';

export function RecordPage() {
  useTitle('Record');
  const { slug } = useBrewery();
  const { season } = useBoard();
  const [params] = useSearchParams();
  const filter = filterOf(params);
  const { data, error, isPending, hasNextPage, isFetchingNextPage, fetchNextPage } = useRecord(
    slug,
    season,
    filter,
  );
  return (
    <Page>
      <PageHead title="Record" lead={`Everything that happened in ${season.name}, newest first.`} />
      <Filters />
      {error && <Notice kind="hold">{sentenceOf(error)}</Notice>}
      {isPending && <Skeleton label="Loading the record" />}
      {data && (
        <Days
          entries={data.pages.flatMap(({ changes }) => changes)}
          filtered={isFiltered(filter)}
        />
      )}
      {hasNextPage && (
        <Button className="mt-6" disabled={isFetchingNextPage} onClick={() => void fetchNextPage()}>
          {isFetchingNextPage ? 'Loading …' : 'Show older'}
        </Button>
      )}
    </Page>
  );
}

interface DaysProps {
  entries: readonly RecordEntry[];
  filtered: boolean;
}

function Days({ entries, filtered }: DaysProps) {
  if (entries.length === 0)
    return (
      <p className="text-ink2">
        {filtered
          ? 'Nothing on the record is like that. Choose less, or another.'
          : 'Nothing has happened yet.'}
      </p>
    );
  return (
    <div className="max-w-4xl space-y-7">
      {byDay(entries).map(({ day, entries: ofDay }) => (
        <section key={day} aria-labelledby={`day-${day}`}>
          <h2
            id={`day-${day}`}
            className="border-b-[1.5px] border-line pb-1.5 font-display text-shelf font-bold tracking-[-.02em]"
          >
            {formatDay(day)} {day.slice(0, 4)}
          </h2>
          <ol className="divide-y divide-line2">
            {ofDay.map((entry) => (
              <Entry key={entry.id} entry={entry} />
            ))}
          </ol>
        </section>
      ))}
    </div>
  );
}
