import { Suspense } from 'react';
import { READING_EVERY_DAYS } from '#shared/today/duties.ts';
import { todayList } from '#shared/today/today.ts';
import { dayIn } from '#shared/units/dayIn.ts';
import { formatDay } from '#shared/units/day.ts';
import { sentenceOf } from '../../api/errors.ts';
import { useTodayFacts } from '../../api/today.ts';
import { useTitle } from '../../app/useTitle.ts';
import { Notice } from '../../components/ui/Notice.tsx';
import { PageHead } from '../../components/ui/PageHead.tsx';
import { Skeleton } from '../../components/ui/Skeleton.tsx';
import { BoardFault } from '../board/states/BoardFault.tsx';
import { BoardSkeleton } from '../board/states/BoardSkeleton.tsx';
import { BoardViewProvider, useBoardView } from '../board/view/BoardView.tsx';
import { useNow } from '../pour/useNow.ts';
import { Page } from '../shell/Page.tsx';
import { DutyList } from './DutyList.tsx';
import { NothingDue } from './NothingDue.tsx';

const A_MINUTE_MS = 60_000;

/** What is to be done today and in the week after, by the brewery's own calendar. */
export function TodayPage() {
  useTitle('Today');
  return (
    <BoardFault>
      <Suspense fallback={<BoardSkeleton />}>
        <BoardViewProvider>
          <Today />
        </BoardViewProvider>
      </Suspense>
    </BoardFault>
  );
}

function Today() {
  const { board, slug } = useBoardView();
  const facts = useTodayFacts(slug, board.season.revision);
  const now = useNow(A_MINUTE_MS);
  const today = dayIn(board.brewery.timeZone, new Date(now));
  return (
    <Page>
      <div className="mx-auto max-w-3xl">
        <PageHead title="Today" lead={formatDay(today)} />
        {facts.data ? (
          <Lists list={todayList(board, facts.data, today)} />
        ) : facts.error ? (
          <Notice kind="hold">{sentenceOf(facts.error)}</Notice>
        ) : (
          <Skeleton label="Loading what is due" />
        )}
      </div>
    </Page>
  );
}

function Lists({ list }: { list: ReturnType<typeof todayList> }) {
  const { due, week, next, today } = list;
  if (due.length === 0 && week.length === 0) return <NothingDue next={next} />;
  return (
    <>
      {due.length > 0 ? (
        <DutyList title="Due today" duties={due} today={today} />
      ) : (
        <p className="text-lead text-ink2">Nothing is due today.</p>
      )}
      {week.length > 0 && <DutyList title="This week" duties={week} today={today} dated />}
      {[...due, ...week].some(({ kind }) => kind === 'reading') && (
        <p className="mt-6 text-small text-ink2">
          A fermenting beer is read every {READING_EVERY_DAYS} days here: common practice. Near its
          end two readings 48 hours apart tell that it is done.
        </p>
      )}
    </>
  );
}
