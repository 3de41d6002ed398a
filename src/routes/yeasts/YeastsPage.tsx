import { useState } from 'react';
import type { Yeast } from '#shared/api/yeast.ts';
import { useBoard } from '../../api/board.ts';
import { useTitle } from '../../app/useTitle.ts';
import { Button } from '../../components/ui/Button.tsx';
import { PageHead } from '../../components/ui/PageHead.tsx';
import { ReadOnlyNote } from '../shell/ReadOnlyNote.tsx';
import { Page } from '../shell/Page.tsx';
import { NoYeasts } from './NoYeasts.tsx';
import { YeastCard } from './YeastCard.tsx';
import { YeastDialog } from './YeastDialog.tsx';

export function YeastsPage() {
  useTitle('Yeasts');
  const { yeasts, me } = useBoard();
  const [open, setOpen] = useState<Yeast | 'new' | null>(null);
  const mayEdit = me.can.editYeastsAndVessels;
  return (
    <Page>
      <PageHead
        title="Yeasts"
        lead="What each one is, what it stands, and which shelves live on it."
        actions={
          mayEdit && (
            <Button look="first" onClick={() => setOpen('new')}>
              New yeast
            </Button>
          )
        }
      />
      {!mayEdit && <ReadOnlyNote what="yeasts" />}
      {yeasts.length === 0 ? (
        <NoYeasts {...(mayEdit && { onNew: () => setOpen('new') })} />
      ) : (
        <ul className="grid gap-4 tablet:grid-cols-2 wide:grid-cols-3">
          {yeasts.map((yeast) => (
            <YeastCard
              key={yeast.id}
              yeast={yeast}
              {...(mayEdit && { onEdit: () => setOpen(yeast) })}
            />
          ))}
        </ul>
      )}
      {open !== null && (
        <YeastDialog yeast={open === 'new' ? null : open} onClose={() => setOpen(null)} />
      )}
    </Page>
  );
}
