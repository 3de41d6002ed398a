import { useRecord } from '../../api/record.ts';
import { Button } from '../../components/ui/Button.tsx';
import { Card, CardTitle } from '../../components/ui/Card.tsx';
import { Skeleton } from '../../components/ui/Skeleton.tsx';
import { TextLink } from '../../components/ui/TextLink.tsx';
import { useBrewery } from '../../app/useBrewery.ts';
import { useBoardView } from '../board/view/BoardView.tsx';
import { Entry } from '../record/Entry.tsx';

/** What the change record tells of this batch, newest first. */
export function HistoryCard({ batchId }: { batchId: string }) {
  const { slug, path } = useBrewery();
  const { season } = useBoardView().board;
  const { data, hasNextPage, fetchNextPage, isFetchingNextPage, isPending } = useRecord(
    slug,
    season,
    { batch: batchId },
  );
  const entries = data?.pages.flatMap(({ changes }) => changes) ?? [];
  return (
    <Card>
      <div className="flex items-baseline gap-3">
        <CardTitle>History</CardTitle>
        <span className="ml-auto text-small">
          <TextLink to={path(`record?batch=${batchId}`)}>The whole record</TextLink>
        </span>
      </div>
      {isPending && <Skeleton rows={2} />}
      {!isPending && entries.length === 0 && (
        <p className="mt-2 text-ink2">Nothing has been changed yet.</p>
      )}
      <ul className="divide-y divide-line2">
        {entries.slice(0, data && data.pages.length > 1 ? undefined : SHOWN).map((entry) => (
          <Entry key={entry.id} entry={entry} />
        ))}
      </ul>
      {hasNextPage && (
        <Button
          look="quiet"
          size="small"
          disabled={isFetchingNextPage}
          onClick={() => void fetchNextPage()}
        >
          Show older changes
        </Button>
      )}
    </Card>
  );
}

/** So many before somebody asks for more. */
const SHOWN = 8;
