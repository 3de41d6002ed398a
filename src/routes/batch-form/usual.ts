import type { Board } from '#shared/api/board.ts';
import type { Yeast } from '#shared/api/yeast.ts';

/** Apparent attenuation of a yeast that says nothing (common practice). */
export const USUAL_ATTENUATION = 0.75;

/** Days under beer and temperature that a plan starts from (common practice). */
const USUAL = {
  ale: { days: 14, celsius: 20 },
  lager: { days: 24, celsius: 11 },
} as const;

/** The yeast a batch will meet: the one it asks for, else that of its shelf. */
export function yeastOf(
  board: Pick<Board, 'yeasts' | 'chains'>,
  yeastId: string | null,
  chainId: string | null,
): Yeast | undefined {
  const chain = board.chains.find((one) => one.id === chainId);
  return board.yeasts.find((one) => one.id === (yeastId ?? chain?.yeastId));
}

/** Final gravity from original gravity and apparent attenuation, to 0.001. */
export const usualFg = (og: number | null, attenuation: number): number | null =>
  og === null ? null : Math.round((1 + (og - 1) * (1 - attenuation)) * 1000) / 1000;

export const usualDays = (yeast: Yeast | undefined): number => USUAL[yeast?.kind ?? 'ale'].days;

/** Middle of the yeast's own range, to half a degree. */
export function usualCelsius(yeast: Yeast | undefined): number {
  if (!yeast || yeast.fermentMinC === null || yeast.fermentMaxC === null)
    return USUAL[yeast?.kind ?? 'ale'].celsius;
  return Math.round(yeast.fermentMinC + yeast.fermentMaxC) / 2;
}

/** The volume most lately written down, as the likely next one. */
export const lastVolume = (board: Pick<Board, 'batches'>): number | null =>
  board.batches.filter((batch) => batch.volumeL !== null).at(-1)?.volumeL ?? null;
