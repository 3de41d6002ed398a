import { ChevronDown } from 'lucide-react';
import { useId, useState } from 'react';
import type { Batch } from '#shared/api/batch.ts';
import type { JudgedLink } from '#shared/chain/judgeBoard.ts';
import { VerdictPill } from '../../components/drawn/VerdictPill.tsx';
import { uncheckedWord } from '../../components/drawn/verdictWords.ts';
import { BlendTable } from '../board/panel/BlendTable.tsx';
import { FindingBlock } from '../board/panel/FindingBlock.tsx';
import { pourLine } from '../board/panel/LinkTitle.tsx';
import { PanelPart } from '../board/panel/PanelFrame.tsx';
import { PassedChecks } from '../board/panel/PassedChecks.tsx';
import { RULE_QUESTIONS } from '../board/panel/ruleWords.ts';
import { useBoardView } from '../board/view/BoardView.tsx';
import { countedFindings, gravityStep, shortReason } from '../board/view/words.ts';

interface SharedLinkProps {
  earlier: Batch;
  later: Batch;
  link: JudgedLink;
}

/** The verdict between two batches; pressed, it opens to what stands behind it. */
export function SharedLink({ earlier, later, link }: SharedLinkProps) {
  const { units } = useBoardView();
  const [isOpen, setOpen] = useState(false);
  const id = useId();
  const words = [
    shortReason(link, gravityStep(earlier, later, units)),
    ...(link.accepted ? ['accepted'] : []),
    ...(link.unchecked.length > 0 ? [uncheckedWord(link.unchecked.length)] : []),
  ];
  return (
    <div className="relative ml-[100px] pt-1 pb-4">
      <button
        type="button"
        aria-expanded={isOpen}
        aria-controls={id}
        onClick={() => setOpen(!isOpen)}
        className="flex min-h-11 w-full items-center gap-2.5 rounded-lg text-left text-body text-ink2"
      >
        <span className="sr-only">
          {later.name} onto {earlier.name}:
        </span>
        <VerdictPill verdict={link.verdict} findings={countedFindings(link)} large />
        <span className="min-w-0 flex-1 leading-tight">{words.filter(Boolean).join(', ')}</span>
        <ChevronDown
          size={18}
          aria-hidden
          className={isOpen ? 'shrink-0 rotate-180' : 'shrink-0'}
        />
      </button>
      <div
        id={id}
        hidden={!isOpen}
        className="relative z-10 mt-1 rounded-card border border-line bg-paper px-4 py-3 max-tablet:-ml-[100px]"
      >
        {isOpen && <Opened earlier={earlier} later={later} link={link} />}
      </div>
    </div>
  );
}

function Opened({ earlier, later, link }: SharedLinkProps) {
  const questions = link.unchecked.map(({ rule }) => RULE_QUESTIONS[rule]).join(' · ');
  return (
    <>
      <p className="text-ink2">
        {pourLine(earlier, later)}
        {link.generation !== null && ` · generation ${link.generation}`}
      </p>
      <BlendTable earlier={earlier} later={later} answer={link} />
      {link.findings.map((finding) => (
        <FindingBlock key={finding.rule} finding={finding} science="/about/science" />
      ))}
      {link.unchecked.length > 0 && (
        <PanelPart title={`Not checked: ${link.unchecked.length}`}>
          <p className="mt-1 text-ink2 first-letter:uppercase">{questions}</p>
        </PanelPart>
      )}
      <PassedChecks passed={link.passed} />
    </>
  );
}
