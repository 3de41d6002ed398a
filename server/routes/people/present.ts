import type { Member, Role } from '#shared/api/people.ts';

export interface MemberRow {
  personId: string;
  name: string;
  role: Role;
}

export const presentMember = (row: MemberRow): Member => ({
  ...row,
  initials: initialsOf(row.name),
});

/** First letters of the first two words; of one word its first two letters. */
export function initialsOf(name: string): string {
  const [first = '', second] = name.split(/\s+/u);
  const letters = second
    ? [first, second].map((word) => firstLetters(word, 1))
    : [firstLetters(first, 2)];
  return letters.join('').toUpperCase().slice(0, 3);
}

/** Whole letters: accents and the like stay with theirs. */
const firstLetters = (word: string, count: number) =>
  Array.from(new Intl.Segmenter().segment(word), ({ segment }) => segment)
    .slice(0, count)
    .join('');
