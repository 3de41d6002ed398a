import type { Verdict } from '#shared/rules/vocabulary.ts';
import { VerdictMark } from '../../components/drawn/VerdictMark.tsx';
import type { Explained } from './rulesExplained.ts';

export function RuleBlock({ rule }: { rule: Explained }) {
  return (
    <article
      id={rule.id}
      className="scroll-mt-4 rounded-card border-[1.5px] border-line bg-paper p-5"
    >
      <h3 className="text-shelf">{rule.title}</h3>
      <p className="mt-1">{rule.looks}</p>
      <ul className="mt-3 space-y-1.5">
        {rule.minds && <Limit verdict="mind" word="Mind" text={rule.minds} />}
        {rule.holds && <Limit verdict="hold" word="Hold" text={rule.holds} />}
      </ul>
      <p className="mt-3 text-small text-ink2">{rule.basis}</p>
    </article>
  );
}

const TONE: Record<Verdict, string> = { pour: 'text-pour', mind: 'text-mind', hold: 'text-hold' };

function Limit({ verdict, word, text }: { verdict: Verdict; word: string; text: string }) {
  return (
    <li className="flex gap-2.5">
      <span className={`mt-0.5 shrink-0 ${TONE[verdict]}`}>
        <VerdictMark verdict={verdict} size={16} />
      </span>
      <span>
        <b className={TONE[verdict]}>{word}.</b> {text}
      </span>
    </li>
  );
}
