import type { Batch } from '#shared/api/batch.ts';
import type { JudgedLink } from '#shared/chain/judgeBoard.ts';
import type { Finding } from '#shared/rules/answer.ts';
import { unbroken } from '../../../app/unbroken.ts';
import { VerdictMark } from '../../../components/drawn/VerdictMark.tsx';
import { VERDICT_WORDS } from '../../../components/drawn/verdictWords.ts';
import { RULE_QUESTIONS } from '../../board/panel/ruleWords.ts';
import { SheetPart } from './SheetPart.tsx';

/** Told elsewhere on the sheet. */
const ELSEWHERE = ['jar-the-rest', 'oxygen', 'second-oxygen'];

/** Every finding with why and what to do, who accepted a hold and why, what was not checked. */
export function SheetFindings({ later, link }: { later: Batch; link: JudgedLink }) {
  const { acceptance } = later.link;
  const saysHops = link.findings.some(({ rule }) => rule === 'hops-in-cake');
  const told = saysHops ? [...ELSEWHERE, 'harvest-before-hops'] : ELSEWHERE;
  const advice = link.advice.filter(({ id }) => !told.includes(id));
  return (
    <SheetPart title={link.findings.length === 0 ? 'Nothing speaks against it' : 'What to look at'}>
      {link.findings.map((finding) => (
        <PaperFinding key={finding.rule} finding={finding} />
      ))}
      {link.accepted && acceptance && (
        <p>
          <b>Accepted by {acceptance.by}:</b> {acceptance.reason}
        </p>
      )}
      {link.unchecked.length > 0 && (
        <p>
          <b>Not checked</b>, for want of facts:{' '}
          {link.unchecked.map(({ rule }) => RULE_QUESTIONS[rule]).join(', ')}.
        </p>
      )}
      {advice.map(({ id, text }) => (
        <p key={id}>{unbroken(text)}</p>
      ))}
    </SheetPart>
  );
}

export function PaperFinding({ finding }: { finding: Finding }) {
  return (
    <p>
      <b className="whitespace-nowrap">
        <span className="mr-1 inline-block align-[-0.15em]">
          <VerdictMark verdict={finding.verdict} size={13} />
        </span>
        {VERDICT_WORDS[finding.verdict]}: {finding.title}.
      </b>{' '}
      {unbroken(finding.because)} <b>Do:</b> {unbroken(finding.do)}
    </p>
  );
}
