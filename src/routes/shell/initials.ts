/** Two letters for a name: of its first and its last word, or its first two. */
export function initialsOf(name: string): string {
  const words = name.trim().split(/\s+/u);
  const first = Array.from(words[0] ?? '');
  const last = words.length > 1 ? Array.from(words.at(-1) ?? '') : [];
  const letters = last.length > 0 ? [first[0], last[0]] : first.slice(0, 2);
  return letters.join('').toLocaleUpperCase('en-GB');
}
