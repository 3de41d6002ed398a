import clsx from 'clsx';

interface AvatarProps {
  initials: string;
  name: string;
  /** Place among the members; gives the ground. */
  place?: number;
  size?: 30 | 32;
}

const GROUNDS = [
  'bg-[var(--person1)]',
  'bg-[var(--person2)]',
  'bg-[var(--person3)]',
  'bg-[var(--person4)]',
] as const;

/** A person's initials on their own ground. */
export function Avatar({ initials, name, place = 0, size = 32 }: AvatarProps) {
  return (
    <span
      role="img"
      aria-label={name}
      title={name}
      className={clsx(
        'inline-grid shrink-0 place-items-center rounded-full text-label font-bold text-[var(--on-person)]',
        size === 30 ? 'size-[30px]' : 'size-8',
        GROUNDS[place % GROUNDS.length],
      )}
    >
      {initials}
    </span>
  );
}
