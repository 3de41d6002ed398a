import type { Verdict } from '#shared/rules/vocabulary.ts';

export const VERDICT_WORDS: Record<Verdict, string> = { pour: 'Pour', mind: 'Mind', hold: 'Hold' };

/** "Pour", "Mind 1", "Hold 2": the word and how many findings stand behind it. */
export const verdictWord = (verdict: Verdict, findings: number): string =>
  verdict === 'pour' || findings < 1
    ? VERDICT_WORDS[verdict]
    : `${VERDICT_WORDS[verdict]} ${findings}`;

export const uncheckedWord = (unchecked: number): string =>
  unchecked > 0 ? `${unchecked} not checked` : '';
