import type { Finding } from '#shared/rules/answer.ts';
import { lowered } from '../../../app/lowered.ts';
import { scienceSectionOf } from '../../../app/scienceSections.ts';
import { unbroken } from '../../../app/unbroken.ts';
import { VerdictMark } from '../../../components/drawn/VerdictMark.tsx';
import { VERDICT_WORDS } from '../../../components/drawn/verdictWords.ts';
import { TextLink } from '../../../components/ui/TextLink.tsx';
import { MeasureList } from './MeasureList.tsx';
import { PanelPart } from './PanelFrame.tsx';

interface FindingBlockProps {
  finding: Finding;
  /** The science page, with the figures of this link. */
  science: string;
}

/** One finding: its title, why, what to do, the numbers, what it rests on. */
export function FindingBlock({ finding, science }: FindingBlockProps) {
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
        <b className="text-ink">Do:</b> {unbroken(lowered(finding.do))}
      </p>
      <MeasureList measures={finding.measures} />
      <p className="mt-1.5 text-label text-ink2">
        Rests on: {unbroken(finding.basis)}{' '}
        <TextLink
          to={`${science}#${scienceSectionOf(finding.rule)}`}
          className="inline-block max-tablet:py-2.5"
        >
          The science of it
          <span className="sr-only">: {finding.title}</span>
        </TextLink>
      </p>
    </PanelPart>
  );
}
