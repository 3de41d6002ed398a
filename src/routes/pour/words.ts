import type { PourStep } from '#shared/api/pour.ts';
import type { Verdict } from '#shared/rules/vocabulary.ts';

export const STEP_NAMES: Record<PourStep, string> = {
  racked: 'Finished and racked',
  cake: 'Cake check',
  keep: 'How much to keep',
  clean: 'Clean and sanitised',
  wort: 'Wort temperature',
  after: 'Air, lid and blow-off',
};

/** The steps of a pour; onto fresh yeast there is no cake to look at. */
export const stepsOf = (ontoCake: boolean): PourStep[] =>
  ontoCake ? ['racked', 'cake', 'keep', 'clean', 'wort', 'after'] : ['clean', 'wort', 'after'];

export const TONES: Record<Verdict, string> = {
  pour: 'border-pour bg-pour-l text-pour',
  mind: 'border-mind bg-mind-l text-mind',
  hold: 'border-hold bg-hold-l text-hold',
};

const MINUTE = 60_000;

/** "in 12 minutes", "now", "in 3 hours 10 minutes". */
export function inTime(at: number, now: number): string {
  const minutes = Math.round((at - now) / MINUTE);
  if (minutes <= 0) return 'by now';
  if (minutes === 1) return 'in 1 minute';
  if (minutes < 100) return `in ${minutes} minutes`;
  const hours = Math.floor(minutes / 60);
  const rest = minutes % 60;
  return rest === 0 ? `in ${hours} hours` : `in ${hours} h ${rest} min`;
}

/** "just now", "4 minutes ago". */
export function ago(at: number, now: number): string {
  const minutes = Math.max(0, Math.floor((now - at) / MINUTE));
  if (minutes === 0) return 'just now';
  return minutes === 1 ? '1 minute ago' : minutes < 100 ? `${minutes} minutes ago` : 'long ago';
}
