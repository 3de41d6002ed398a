import { useNavigate } from 'react-router-dom';
import type { ListedSeason } from '#shared/api/brewery.ts';
import { seasonOf } from '#shared/api/urls.ts';
import { useSeasonDelete } from '../../../api/seasons.ts';
import { useBrewery } from '../../../app/useBrewery.ts';
import { ConfirmDialog } from '../../../components/ui/ConfirmDialog.tsx';
import { say } from '../../../components/ui/Toast.tsx';

interface DeleteSeasonProps {
  season: ListedSeason;
  onClose: () => void;
}

export function DeleteSeason({ season, onClose }: DeleteSeasonProps) {
  const { slug, brewerySlug } = useBrewery();
  const navigate = useNavigate();
  const remove = useSeasonDelete(slug, async () => {
    // Its own address shows nothing any more.
    if (seasonOf(slug) === season.id) await navigate(`/b/${brewerySlug}/season`);
  });
  const done = () => {
    say(`${season.name} is deleted.`);
    onClose();
  };
  return (
    <ConfirmDialog
      open
      onClose={onClose}
      title={`Delete ${season.name}?`}
      action="Delete the season"
      busy={remove.isPending}
      error={remove.error}
      onConfirm={() => void remove.mutateAsync(season).then(done, () => null)}
    >
      <p>Nothing stands on it. This cannot be undone.</p>
    </ConfirmDialog>
  );
}
