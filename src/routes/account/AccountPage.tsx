import type { ReactNode } from 'react';
import { useSession } from '../../api/session.ts';
import { useTitle } from '../../app/useTitle.ts';
import { Card, CardTitle } from '../../components/ui/Card.tsx';
import { PageHead } from '../../components/ui/PageHead.tsx';
import { Page } from '../shell/Page.tsx';
import { CloseAccount } from './CloseAccount.tsx';
import { EmailForm } from './EmailForm.tsx';
import { NameForm } from './NameForm.tsx';
import { PasswordForm } from './PasswordForm.tsx';
import { SignIns } from './SignIns.tsx';
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
        <div className="space-y-4">
          <Part
            title="Units"
            lead="Only how numbers are shown to you. What you typed is kept as you typed it."
          >
            <UnitChoices me={me} />
          </Part>
          <Part title="Theme">
            <ThemeChoice me={me} />
          </Part>
          <Part title="Where you are signed in">
            <SignIns />
          </Part>
        </div>
        <div className="space-y-4">
          <Part title="Your name">
            <NameForm key={me.name} me={me} />
          </Part>
          <Part title="E-mail address">
            <EmailForm key={me.email} me={me} />
          </Part>
          <Part title="Password" lead="Changing it signs you out everywhere else.">
            <PasswordForm />
          </Part>
          <Part title="Close the account">
            <CloseAccount />
          </Part>
        </div>
      </div>
    </Page>
  );
}

function Part({ title, lead, children }: { title: string; lead?: string; children: ReactNode }) {
  return (
    <Card>
      <CardTitle>{title}</CardTitle>
      {lead && <p className="mt-1 text-ink2">{lead}</p>}
      <div className="mt-4">{children}</div>
    </Card>
  );
}
