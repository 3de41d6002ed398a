/** A sentence or title as it goes on within another: an abbreviation at its head keeps its capitals. */
export const lowered = (text: string): string =>
  /^[A-Z][a-z ]/.test(text) ? text.charAt(0).toLowerCase() + text.slice(1) : text;
