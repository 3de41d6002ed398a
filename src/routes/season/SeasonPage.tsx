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

export function SeasonPage() {
  useTitle('Season');
  const board = useBoard();
  const mayEdit = board.me.can.editSeason;
  return (
    <Page>
      <PageHead
        title="Season"
        lead="When the brewery brews, and the days that are taken."
        actions={<SeasonLinks />}
      />
      {mayEdit ? (
        <div className="grid items-start gap-4 wide:grid-cols-2">
          <Card>
            <CardTitle>Brew days</CardTitle>
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
