import clsx from 'clsx';

interface GenerationMarksProps {
  /** First and last generation on this shelf; null on an empty one. */
  generations: readonly [number, number] | null;
  limit: number;
}

/** How many marks fit beside a shelf. */
const MOST = 10;

/** One mark a generation: filled where this chain stands, empty where the yeast still may go. */
export function GenerationMarks({ generations, limit }: GenerationMarksProps) {
  const count = Math.min(MOST, Math.max(limit, generations?.[1] ?? 0));
  return (
    <span aria-hidden className="flex gap-[3px]">
      {Array.from({ length: count }, (_, i) => {
        const used = generations !== null && i + 1 >= generations[0] && i + 1 <= generations[1];
        return (
          <i
            key={i}
            className={clsx(
              'h-2 w-[15px] rounded-[2px]',
              used ? 'bg-cake-d inset-ring-[1.5px] inset-ring-cake-dd' : 'bg-dot0',
              i + 1 > limit && 'inset-ring-[1.5px] inset-ring-hold',
            )}
          />
        );
      })}
    </span>
  );
}
