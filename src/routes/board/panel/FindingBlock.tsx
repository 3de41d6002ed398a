import type { Finding } from '#shared/rules/answer.ts';
import { unbroken } from '../../../app/unbroken.ts';
import { VerdictMark } from '../../../components/drawn/VerdictMark.tsx';
import { VERDICT_WORDS } from '../../../components/drawn/verdictWords.ts';
import { MeasureList } from './MeasureList.tsx';
import { PanelPart } from './PanelFrame.tsx';

/** One finding: its title, why, what to do, the numbers, what it rests on. */
export function FindingBlock({ finding }: { finding: Finding }) {
  const tone = finding.verdict === 'hold' ? 'text-hold' : 'text-mind';
  return (
    <PanelPart
      tone={tone}
      title={
        <span className="flex items-center gap-2">
          <VerdictMark verdict={finding.verdict} />
          <span className="sr-only">{VERDICT_WORDS[finding.verdict]}: </span>
          {finding.title}
        </span>
      }
    >
      <p className="mt-1 text-ink2">{unbroken(finding.because)}</p>
      <p className="mt-1 text-ink2">
        <b className="text-ink">Do:</b> {unbroken(lowerFirst(finding.do))}
      </p>
      <MeasureList measures={finding.measures} />
      <p className="mt-1.5 text-label text-ink2">Rests on: {unbroken(finding.basis)}</p>
    </PanelPart>
  );
}

/** The remedy follows "Do:"; a trade abbreviation keeps its capitals. */
const lowerFirst = (text: string): string =>
  /^[A-Z][a-z ]/.test(text) ? text.charAt(0).toLowerCase() + text.slice(1) : text;
