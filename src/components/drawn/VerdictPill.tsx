import clsx from 'clsx';
import type { Verdict } from '#shared/rules/vocabulary.ts';
import { VerdictMark } from './VerdictMark.tsx';
import { uncheckedWord, verdictWord } from './verdictWords.ts';

const TONES: Record<Verdict, string> = {
  pour: 'text-pour bg-pour-l',
  mind: 'text-mind bg-mind-l',
  hold: 'text-hold bg-hold-l',
};

interface VerdictPillProps {
  verdict: Verdict;
  /** How many findings stand behind it. */
  findings?: number;
  unchecked?: number;
  /** On a phone it is read at arm's length. */
  large?: boolean;
  /** Replaces the word, as in "Hold: other yeast". */
  word?: string;
}

/** Shape and word on the verdict's ground; what could not be checked stands beside it. */
export function VerdictPill(props: VerdictPillProps) {
  const { verdict, findings = 0, unchecked = 0, large = false, word } = props;
  return (
    <span className="inline-flex items-center gap-2">
      <span
        data-verdict={verdict}
        className={clsx(
          'inline-flex items-center gap-1.5 rounded-verdict border-[1.5px] border-current font-bold whitespace-nowrap',
          large ? 'py-1 pr-3 pl-1.5 text-body' : 'py-[3px] pr-[11px] pl-[5px] text-label',
          TONES[verdict],
        )}
      >
        <VerdictMark verdict={verdict} size={large ? 18 : 16} />
        {word ?? verdictWord(verdict, findings)}
      </span>
      {unchecked > 0 && (
        <span className="text-label whitespace-nowrap text-ink2">{uncheckedWord(unchecked)}</span>
      )}
    </span>
  );
}
