import type { RuleId } from '#shared/rules/vocabulary.ts';
import { capital } from '#shared/rules/words.ts';
import { PanelPart } from './PanelFrame.tsx';
import { RULE_WORDS } from './ruleWords.ts';

export function PassedChecks({ passed }: { passed: readonly RuleId[] }) {
  if (passed.length === 0) return null;
  const words = passed.map((rule) => RULE_WORDS[rule]).join(' · ');
  return (
    <PanelPart tone="text-pour" title="Also checked, all good">
      <p className="mt-1 text-ink2">{capital(words)}</p>
    </PanelPart>
  );
}
