import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import type { Board } from '#shared/api/board.ts';
import type { ListedSeason } from '#shared/api/brewery.ts';
import { placeOf } from '#shared/api/urls.ts';
import { boardQuery } from '../../../api/board.ts';
import { sentenceOf } from '../../../api/errors.ts';
import { useSeasonCreate } from '../../../api/seasons.ts';
import { useBrewery } from '../../../app/useBrewery.ts';
import { useUnits } from '../../../app/useUnits.ts';
import { contractResolver } from '../../../components/form/contractResolver.ts';
import { Form } from '../../../components/form/Form.tsx';
import { Dialog } from '../../../components/ui/Dialog.tsx';
import { Notice } from '../../../components/ui/Notice.tsx';
import { Skeleton } from '../../../components/ui/Skeleton.tsx';
import { say } from '../../../components/ui/Toast.tsx';
import { SeasonFields } from '../SeasonFields.tsx';
import { CopyFields } from './CopyFields.tsx';
import { newSeasonContract, newSeasonValues, seasonCreateOf } from './newSeason.ts';

interface NewSeasonDialogProps {
  /** The season whose plan is copied; absent: an empty one is made. */
  from?: ListedSeason | null;
  onClose: () => void;
}

export function NewSeasonDialog({ from = null, onClose }: NewSeasonDialogProps) {
  const { slug, brewerySlug } = useBrewery();
  const place = from ? placeOf(brewerySlug, from.id) : slug;
  const { data: board, error } = useQuery(boardQuery(place));
  return (
    <Dialog
      open
      wide={from !== null}
      onClose={onClose}
      title={from ? `Copy ${from.name}` : 'New season'}
      lead={
        from
          ? 'Its plan, all pencilled. Yeasts and vessels stay the brewery’s; what was read and accepted stays behind.'
          : 'With an empty board. It becomes the current one when you say so.'
      }
    >
      {error && <Notice kind="hold">{sentenceOf(error)}</Notice>}
      {!board && !error && <Skeleton label="Loading the season" />}
      {board && <NewSeasonForm board={board} from={from} onClose={onClose} />}
    </Dialog>
  );
}

interface NewSeasonFormProps {
  board: Board;
  from: ListedSeason | null;
  onClose: () => void;
}

function NewSeasonForm({ board, from, onClose }: NewSeasonFormProps) {
  const { slug } = useBrewery();
  const units = useUnits();
  const create = useSeasonCreate(slug);
  const [values] = useState(() => newSeasonValues(from, board, units));
  const form = useForm({
    resolver: contractResolver(newSeasonContract),
    defaultValues: values,
  });
  return (
    <Form
      form={form}
      action={from ? 'Copy the season' : 'Make the season'}
      busyAction={from ? 'Copying it' : 'Making it'}
      onCancel={onClose}
      onSubmit={async (written) => {
        await create.mutateAsync(seasonCreateOf(written, from));
        say(`${written.name} is in the list.`);
        onClose();
      }}
    >
      <SeasonFields />
      {from && <CopyFields board={board} />}
    </Form>
  );
}
