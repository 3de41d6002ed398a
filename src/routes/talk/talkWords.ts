import type { CommentAbout, SaidVerdict } from '#shared/api/comment.ts';
import type { Day } from '#shared/rules/vocabulary.ts';
import { formatDayShort } from '#shared/units/day.ts';
import { lowered } from '../../app/lowered.ts';
import { verdictWord } from '../../components/drawn/verdictWords.ts';

/** "today, 09:12", "27 Mar": by the clock of whoever reads. */
export function whenSaid(at: string, today: Day): string {
  const said = new Date(at);
  const pad = (n: number) => String(n).padStart(2, '0');
  const day = `${said.getFullYear()}-${pad(said.getMonth() + 1)}-${pad(said.getDate())}`;
  if (day !== today) return formatDayShort(day);
  return `today, ${pad(said.getHours())}:${pad(said.getMinutes())}`;
}

/** "Hold: tired cake". */
export function saidWords({ verdict, findings, reason }: SaidVerdict): string {
  const word = verdictWord(verdict, findings);
  return reason === '' ? word : `${word}: ${lowered(reason)}`;
}

export const sameAbout = (a: CommentAbout, b: CommentAbout): boolean =>
  a.kind === b.kind && ('batchId' in a ? a.batchId : '') === ('batchId' in b ? b.batchId : '');
