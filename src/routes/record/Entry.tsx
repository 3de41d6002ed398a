import clsx from 'clsx';
import type { RecordEntry } from '#shared/api/record.ts';
import { fromTo } from '#shared/record/facts.ts';
import { capital } from '#shared/rules/words.ts';
import { useBoard } from '../../api/board.ts';
import { timeOf } from '../../app/zonedTime.ts';
import { Avatar } from '../../components/drawn/Avatar.tsx';
import { TextLink } from '../../components/ui/TextLink.tsx';
import { SayingPill } from '../rules/SayingPill.tsx';
import { initialsOf } from '../shell/initials.ts';
import { linksTold } from './linksTold.ts';
import { usePlaceOf } from './usePlaceOf.ts';

/** One change: who, when, what, and what its links then said. */
export function Entry({ entry }: { entry: RecordEntry }) {
  const { members, brewery } = useBoard();
  const { person, what, undone, at } = entry;
  const place = Math.max(
    0,
    members.findIndex(({ personId }) => personId === person.id),
  );
  const initials =
    members[place]?.personId === person.id ? members[place].initials : initialsOf(person.name);
  return (
    <li className="flex gap-3.5 py-3">
      <span aria-hidden="true">
        <Avatar initials={initials} name={person.name} place={place} />
      </span>
      <div className="min-w-0 grow">
        <p className="text-small text-ink2">
          {person.name}, <time dateTime={at}>{timeOf(at, brewery.timeZone)}</time>
          {undone && <span className="ml-2 font-semibold">undone since</span>}
        </p>
        <p className={clsx('wrap-anywhere', undone ? 'text-ink2 line-through' : 'font-medium')}>
          {what}
        </p>
        <Facts entry={entry} />
        <Links entry={entry} />
        <Where entry={entry} />
      </div>
    </li>
  );
}

/** All that changed, where the sentence could not say it all. */
function Facts({ entry: { facts } }: { entry: RecordEntry }) {
  if (facts.length < 3) return null;
  return (
    <ul className="mt-1 list-disc pl-5 text-small text-ink2">
      {facts.map(({ label, from, to }) => (
        <li key={label}>
          {capital(label)} {fromTo(from, to)}
        </li>
      ))}
    </ul>
  );
}

function Links({ entry }: { entry: RecordEntry }) {
  const told = linksTold(entry);
  if (told.length === 0) return null;
  return (
    <ul className="mt-1.5 space-y-1.5">
      {told.map(({ batchId, words, from, to }) => (
        <li key={batchId} className="flex flex-wrap items-center gap-x-2 gap-y-1 text-small">
          <span>{words}</span>
          {from && (
            <>
              <SayingPill saying={from} />
              <span aria-hidden="true">→</span>
              <span className="sr-only">then</span>
            </>
          )}
          <SayingPill saying={to} />
        </li>
      ))}
    </ul>
  );
}

/** The way to what it is about, where that is still there. */
function Where({ entry }: { entry: RecordEntry }) {
  const place = usePlaceOf(entry);
  if (!place) return null;
  return (
    <p className="mt-1.5 text-small">
      <TextLink to={place.to}>{place.words}</TextLink>
    </p>
  );
}
