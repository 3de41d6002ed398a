/** Keeps a number and what follows it, its unit, on one line: "64.4–71.6 °F" never breaks before °F. */
export const unbroken = (words: string): string => words.replace(/(\d) (?=\S)/g, '$1\u00a0');
