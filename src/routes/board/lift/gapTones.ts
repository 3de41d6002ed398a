import type { Verdict } from '#shared/rules/vocabulary.ts';

export const WORD_TONE: Record<Verdict, string> = {
  pour: 'text-pour',
  mind: 'text-mind',
  hold: 'text-hold',
};

export const OUTLINE_TONE: Record<Verdict, string> = {
  pour: 'fill-pour-l stroke-pour',
  mind: 'fill-mind-l stroke-mind',
  hold: 'fill-hold-l stroke-hold',
};
