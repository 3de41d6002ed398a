import type { Member, Role } from '#shared/api/people.ts';

export interface MemberRow {
  personId: string;
  name: string;
  role: Role;
  version: number;
}

export const presentMember = (row: MemberRow): Member => ({
  ...row,
  initials: initialsOf(row.name),
});

const characters = new Intl.Segmenter();

/** First letters of the first two words; of one word its first two letters. */
export function initialsOf(name: string): string {
  const [first = '', second] = name.split(/\s+/u);
  const letters = second ? firstOf(first, 1) + firstOf(second, 1) : firstOf(first, 2);
  return letters.toUpperCase().slice(0, 3);
}

/** Whole letters: accents and the like stay with theirs. Of plain ones each is whole by itself. */
function firstOf(word: string, count: number): string {
  if (/^[\x20-\x7e]*$/.test(word)) return word.slice(0, count);
  const segments = Array.from(characters.segment(word), ({ segment }) => segment);
  return segments.slice(0, count).join('');
}
