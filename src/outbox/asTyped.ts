import { typedText } from '#shared/api/units.ts';

/** A quantity as it was typed, with its unit: "21,5 °C"; null: it was not typed. SG stands without. */
export function asTyped(typed: unknown): string | null {
  const parsed = typedText.safeParse(typed);
  if (!parsed.success || parsed.data.text === '') return null;
  const { text, unit } = parsed.data;
  return unit === '' || unit === 'SG' || text.endsWith(unit) ? text : `${text} ${unit}`;
}
