import { Ellipsis } from 'lucide-react';
import { useState } from 'react';
import type { ListedSeason } from '#shared/api/brewery.ts';
import { placeOf } from '#shared/api/urls.ts';
import { sentenceOf } from '../../../api/errors.ts';
import { useArchive, useMakeCurrent } from '../../../api/seasons.ts';
import { useBrewery } from '../../../app/useBrewery.ts';
import { useOnline } from '../../../app/useOnline.ts';
import { Menu, MenuItem, MenuSeparator } from '../../../components/ui/Menu.tsx';
import { TextLink } from '../../../components/ui/TextLink.tsx';
import { say } from '../../../components/ui/Toast.tsx';
import { ArchiveSeason } from './ArchiveSeason.tsx';
import { DeleteSeason } from './DeleteSeason.tsx';
import { NewSeasonDialog } from './NewSeasonDialog.tsx';
import { seasonFacts } from './seasonWords.ts';

interface SeasonRowProps {
  season: ListedSeason;
  isShown: boolean;
  mayEdit: boolean;
}

export function SeasonRow({ season, isShown, mayEdit }: SeasonRowProps) {
  const { brewerySlug } = useBrewery();
  const online = useOnline();
  const own = season.isCurrent ? null : season.id;
  return (
    <li className="flex items-center gap-3 py-2.5">
      <div className="min-w-0 grow">
        <p className="flex flex-wrap items-center gap-x-2.5 gap-y-1">
          <TextLink to={`/b/${placeOf(brewerySlug, own)}`} className="font-semibold wrap-anywhere">
            {season.name}
          </TextLink>
          {season.isCurrent && <Tag>Current</Tag>}
          {season.isArchived && <Tag>Archived</Tag>}
          {isShown && <span className="text-small text-ink2">shown here</span>}
        </p>
        <p className="text-small text-ink2">{seasonFacts(season)}</p>
      </div>
      {mayEdit && online && <SeasonMenu season={season} />}
    </li>
  );
}

const Tag = ({ children }: { children: string }) => (
  <span className="rounded-verdict bg-bottle-l px-2 text-label font-bold text-bottle">
    {children}
  </span>
);

function SeasonMenu({ season }: { season: ListedSeason }) {
  const { slug } = useBrewery();
  const [asked, setAsked] = useState<'copy' | 'archive' | 'delete' | null>(null);
  const choose = useMakeCurrent(slug);
  const archive = useArchive(slug);
  const { name, isCurrent, isArchived } = season;
  const isEmpty = season.chains + season.batches === 0;
  // The row may be in another list by the time that it is done.
  const tell = (done: Promise<unknown>, words: string) =>
    void done.then(
      () => say(words),
      (error: unknown) => say(sentenceOf(error)),
    );
  const close = () => setAsked(null);
  return (
    <>
      <Menu
        button={{
          'aria-label': `Season ${name}`,
          className:
            'grid size-9 shrink-0 place-items-center rounded-lg text-ink2 hover:bg-line2 hover:text-ink max-tablet:size-11',
          children: <Ellipsis size={20} aria-hidden />,
        }}
      >
        <MenuItem onSelect={() => setAsked('copy')}>Copy into a new season</MenuItem>
        {!isCurrent && !isArchived && (
          <MenuItem
            onSelect={() => tell(choose.mutateAsync(season), `${name} is the current season.`)}
          >
            Make it the current season
          </MenuItem>
        )}
        {isArchived && (
          <MenuItem
            onSelect={() =>
              tell(
                archive.mutateAsync({ ...season, away: false }),
                `${name} is out of the archive.`,
              )
            }
          >
            Take it out of the archive
          </MenuItem>
        )}
        {!isCurrent && (
          <>
            <MenuSeparator />
            {!isArchived && (
              <MenuItem onSelect={() => setAsked('archive')}>Archive the season</MenuItem>
            )}
            {isEmpty && (
              <MenuItem danger onSelect={() => setAsked('delete')}>
                Delete the season
              </MenuItem>
            )}
          </>
        )}
      </Menu>
      {asked === 'copy' && <NewSeasonDialog from={season} onClose={close} />}
      {asked === 'archive' && <ArchiveSeason season={season} onClose={close} />}
      {asked === 'delete' && <DeleteSeason season={season} onClose={close} />}
    </>
  );
}
