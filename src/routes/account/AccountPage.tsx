import { useSession } from '../../api/session.ts';
import { useTitle } from '../../app/useTitle.ts';
import { Card, CardTitle } from '../../components/ui/Card.tsx';
import { PageHead } from '../../components/ui/PageHead.tsx';
import { Page } from '../shell/Page.tsx';
import { NameForm } from './NameForm.tsx';
import { ThemeChoice } from './ThemeChoice.tsx';
import { UnitChoices } from './UnitChoices.tsx';

export function AccountPage() {
  useTitle('Account');
  const { data: me } = useSession();
  if (!me) return null;
  return (
    <Page>
      <PageHead title="Account" lead={`Signed in as ${me.email}.`} />
      <div className="grid items-start gap-4 wide:grid-cols-2">
        <Card>
          <CardTitle>Units</CardTitle>
          <p className="mt-1 mb-4 text-ink2">
            Only how numbers are shown to you. What you typed is kept as you typed it.
          </p>
          <UnitChoices me={me} />
        </Card>
        <div className="space-y-4">
          <Card>
            <CardTitle>Theme</CardTitle>
            <div className="mt-4">
              <ThemeChoice me={me} />
            </div>
          </Card>
          <Card>
            <CardTitle>Your name</CardTitle>
            <div className="mt-4">
              <NameForm key={me.name} me={me} />
            </div>
          </Card>
        </div>
      </div>
    </Page>
  );
}
