import type { JudgedLink } from '#shared/chain/judgeBoard.ts';
import { lowered } from '../../app/lowered.ts';
import { VerdictMark } from '../../components/drawn/VerdictMark.tsx';
import { uncheckedWord, verdictWord } from '../../components/drawn/verdictWords.ts';
import { countedFindings } from '../board/view/words.ts';

/** Shape, word, and every reason: what is printed cannot be opened to see more. */
export function PaperVerdict({ link }: { link: JudgedLink }) {
  const reasons = [
    ...link.findings.map(({ title }) => lowered(title)),
    ...(link.accepted ? ['accepted'] : []),
    ...(link.unchecked.length > 0 ? [uncheckedWord(link.unchecked.length)] : []),
  ];
  return (
    <span>
      <PaperMark link={link} />
      {reasons.length > 0 && `: ${reasons.join(', ')}`}
    </span>
  );
}

/** "▲ Mind 2". */
export function PaperMark({ link }: { link: JudgedLink }) {
  return (
    <b className="whitespace-nowrap" data-verdict={link.verdict}>
      <span className="mr-1 inline-block align-[-0.15em]">
        <VerdictMark verdict={link.verdict} size={13} />
      </span>
      {verdictWord(link.verdict, countedFindings(link))}
    </b>
  );
}
