import type { Followed } from '../api/batch.ts';
import type { Culture, YeastKind } from '../rules/vocabulary.ts';

/** What a fermentation is watched by. SG, °C; null: not known. */
export interface Watched {
  followed: Followed;
  /** As read, else as planned. */
  og: number | null;
  /** Where it is expected to end. */
  expectedFg: number | null;
  /** The plan's own final gravity, which may be lower than the yeast's. */
  plannedFg: number | null;
  /** Apparent attenuation of the yeast, share. */
  attenuation: number | null;
  kind: YeastKind;
  fermentMinC: number | null;
  fermentMaxC: number | null;
  cultures: readonly Culture[];
}

export const NOTICE_IDS = ['lag', 'stuck', 'too-low', 'temperature'] as const;
export type NoticeId = (typeof NOTICE_IDS)[number];

/** Something that a fermentation does and should not: the fact, then what to do. */
export interface Notice {
  id: NoticeId;
  title: string;
  because: string;
  do: string;
  basis: string;
}

const MS_PER_HOUR = 3_600_000;

/** Hours between two instants. */
export const hoursBetween = (from: string, to: string): number =>
  (Date.parse(to) - Date.parse(from)) / MS_PER_HOUR;
