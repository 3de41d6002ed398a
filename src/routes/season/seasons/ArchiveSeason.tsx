import type { ListedSeason } from '#shared/api/brewery.ts';
import { useArchive } from '../../../api/seasons.ts';
import { useBrewery } from '../../../app/useBrewery.ts';
import { ConfirmDialog } from '../../../components/ui/ConfirmDialog.tsx';
import { say } from '../../../components/ui/Toast.tsx';

interface ArchiveSeasonProps {
  season: ListedSeason;
  onClose: () => void;
}

export function ArchiveSeason({ season, onClose }: ArchiveSeasonProps) {
  const { slug } = useBrewery();
  const archive = useArchive(slug);
  const done = () => {
    say(`${season.name} is archived.`);
    onClose();
  };
  return (
    <ConfirmDialog
      open
      onClose={onClose}
      title={`Archive ${season.name}?`}
      action="Archive the season"
      busy={archive.isPending}
      error={archive.error}
      // The row goes to another list, and this with it; its error is shown above.
      onConfirm={() => void archive.mutateAsync({ ...season, away: true }).then(done, () => null)}
    >
      <p>
        It stays to be read and copied, and nothing on it can be changed, by anybody. You can take
        it out of the archive again.
      </p>
    </ConfirmDialog>
  );
}
