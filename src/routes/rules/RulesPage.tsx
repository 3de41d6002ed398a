import { useHouseRules } from '../../api/houseRules.ts';
import { useBoard } from '../../api/board.ts';
import { useBrewery } from '../../app/useBrewery.ts';
import { useTitle } from '../../app/useTitle.ts';
import { PageHead } from '../../components/ui/PageHead.tsx';
import { TextLink } from '../../components/ui/TextLink.tsx';
import { Page } from '../shell/Page.tsx';
import { ReadOnlyNote } from '../shell/ReadOnlyNote.tsx';
import { History } from './History.tsx';
import { RulesForm } from './RulesForm.tsx';
import { RulesRead } from './RulesRead.tsx';

export function RulesPage() {
  useTitle('House rules');
  const { slug } = useBrewery();
  const row = useHouseRules(slug);
  const { me } = useBoard();
  return (
    <Page>
      <PageHead
        title="House rules"
        lead={
          <>
            The limits by which links are judged in this brewery.{' '}
            <TextLink to="/about/checks">How the checks work</TextLink>
          </>
        }
      />
      {me.can.editSeason ? (
        <RulesForm row={row} />
      ) : (
        <>
          <ReadOnlyNote what="house rules" />
          <RulesRead row={row} />
        </>
      )}
      <History history={row.history} />
    </Page>
  );
}
