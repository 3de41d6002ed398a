import { useState } from 'react';
import type { Vessel } from '#shared/api/vessel.ts';
import { useBoard } from '../../api/board.ts';
import { useTitle } from '../../app/useTitle.ts';
import { Button } from '../../components/ui/Button.tsx';
import { PageHead } from '../../components/ui/PageHead.tsx';
import { Page } from '../shell/Page.tsx';
import { ReadOnlyNote } from '../shell/ReadOnlyNote.tsx';
import { NoVessels } from './NoVessels.tsx';
import { VesselCard } from './VesselCard.tsx';
import { VesselDialog } from './VesselDialog.tsx';

export function VesselsPage() {
  useTitle('Vessels');
  const { vessels, me } = useBoard();
  const [open, setOpen] = useState<Vessel | 'new' | null>(null);
  const mayEdit = me.can.editYeastsAndVessels;
  return (
    <Page>
      <PageHead
        title="Vessels"
        lead="Size and shape, the temperatures each can hold, and when it was last cleaned."
        actions={
          mayEdit && (
            <Button look="first" onClick={() => setOpen('new')}>
              New vessel
            </Button>
          )
        }
      />
      {!mayEdit && <ReadOnlyNote what="vessels" />}
      {vessels.length === 0 ? (
        <NoVessels {...(mayEdit && { onNew: () => setOpen('new') })} />
      ) : (
        <ul className="grid gap-4 tablet:grid-cols-2 wide:grid-cols-3">
          {vessels.map((vessel) => (
            <VesselCard
              key={vessel.id}
              vessel={vessel}
              {...(mayEdit && { onEdit: () => setOpen(vessel) })}
            />
          ))}
        </ul>
      )}
      <VesselCautions />
      {open !== null && (
        <VesselDialog vessel={open === 'new' ? null : open} onClose={() => setOpen(null)} />
      )}
    </Page>
  );
}

function VesselCautions() {
  return (
    <p className="mt-8 max-w-3xl text-small text-ink2">
      Cleaners: cover eyes and hands, never mix them, air the room, and follow the maker's
      instructions. Carry a full glass carboy in a crate, and never pour hot wort into cold glass.
      Release the pressure of a keg before opening it.
    </p>
  );
}
