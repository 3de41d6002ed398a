import clsx from 'clsx';

interface AvatarProps {
  initials: string;
  name: string;
  /** Place among the members; gives the ground. */
  place?: number;
  size?: 30 | 32;
  /** A dot for somebody who is here now; the name says it too. */
  here?: boolean;
}

const GROUNDS = [
  'bg-[var(--person1)]',
  'bg-[var(--person2)]',
  'bg-[var(--person3)]',
  'bg-[var(--person4)]',
] as const;

/** A person's initials on their own ground. */
export function Avatar({ initials, name, place = 0, size = 32, here = false }: AvatarProps) {
  return (
    <span
      role="img"
      aria-label={name}
      title={name}
      className={clsx(
        'relative inline-grid shrink-0 place-items-center rounded-full text-label font-bold text-[var(--on-person)]',
        size === 30 ? 'size-[30px]' : 'size-8',
        GROUNDS[place % GROUNDS.length],
      )}
    >
      {initials}
      {here && (
        <span className="absolute -right-0.5 -bottom-0.5 size-3 rounded-full border-2 border-bar bg-on-bar" />
      )}
    </span>
  );
}
