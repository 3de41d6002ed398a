import { useBoard } from '../../api/board.ts';
import { useTitle } from '../../app/useTitle.ts';
import { Card, CardTitle } from '../../components/ui/Card.tsx';
import { PageHead } from '../../components/ui/PageHead.tsx';
import { Page } from '../shell/Page.tsx';
import { ReadOnlyNote } from '../shell/ReadOnlyNote.tsx';
import { BlockedDays } from './BlockedDays.tsx';
import { BreweryForm } from './BreweryForm.tsx';
import { SeasonForm } from './SeasonForm.tsx';
import { SeasonFacts } from './SeasonFacts.tsx';
import { SeasonLinks } from './SeasonLinks.tsx';
import { SeasonList } from './seasons/SeasonList.tsx';

export function SeasonPage() {
  useTitle('Season');
  const board = useBoard();
  const mayEdit = board.me.can.editSeason;
  // An archived season is not changed, but it can be copied and taken out again.
  const mayEditSeasons = board.me.role === 'head-brewer';
  return (
    <Page>
      <PageHead
        title="Season"
        lead="When the brewery brews, the days that are taken, and the seasons before and after."
        actions={<SeasonLinks />}
      />
      <div className="mb-4">
        <SeasonList shown={board.season.id} mayEdit={mayEditSeasons} />
      </div>
      {mayEdit ? (
        <div className="grid items-start gap-4 wide:grid-cols-2">
          <Card>
            <CardTitle>{board.season.name}</CardTitle>
            <div className="mt-4">
              <SeasonForm season={board.season} />
            </div>
          </Card>
          <div className="space-y-4">
            <BlockedDays season={board.season} />
            <Card>
              <CardTitle>The brewery</CardTitle>
              <div className="mt-4">
                <BreweryForm brewery={board.brewery} />
              </div>
            </Card>
          </div>
        </div>
      ) : (
        <>
          <ReadOnlyNote what="season" />
          <SeasonFacts season={board.season} brewery={board.brewery} />
        </>
      )}
    </Page>
  );
}
