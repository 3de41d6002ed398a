import { NEVER_SOFTENED } from '#shared/rules/resolve.ts';
import { Button } from '../../components/ui/Button.tsx';
import { CHECK_BOX, CHECK_LABEL } from '../../components/form/CheckField.tsx';
import { Card } from '../../components/ui/Card.tsx';
import type { Explained, RuleExplained } from '../checks/rulesExplained.ts';
import { isDefault } from './draft.ts';
import { LimitField } from './LimitField.tsx';
import { RULE_SENTENCES } from './ruleSentences.ts';
import { Sentences, PlainWords } from './Sentences.tsx';
import type { RulesEdit } from './useRulesDraft.ts';

interface RuleCardProps<Shown = Explained> {
  rule: Shown;
  edit: RulesEdit;
}

export function RuleCard({ rule, edit }: RuleCardProps) {
  const { draft, faults } = edit;
  const sentences = RULE_SENTENCES[rule.id];
  const asIs = isDefault(draft, rule.id);
  return (
    <Card className="scroll-mt-4">
      <div className="flex min-h-9 flex-wrap items-center justify-between gap-x-4 gap-y-1">
        <h2 className="font-display text-shelf font-bold tracking-[-.02em]">{rule.title}</h2>
        {!asIs && (
          <Button
            look="quiet"
            size="small"
            aria-label={`${rule.title}: back to the default`}
            onClick={() => edit.reset(rule.id)}
          >
            Back to the default
          </Button>
        )}
      </div>
      {sentences ? (
        <Sentences
          sentences={sentences}
          field={(key, empty) => (
            <LimitField
              limit={key}
              now={draft.limits[key]}
              fault={faults[key]}
              empty={empty}
              onType={(text) => edit.type(key, text)}
            />
          )}
        />
      ) : (
        <PlainWords rule={rule} />
      )}
      {rule.id !== 'wort-temperature' && <Softening rule={rule} edit={edit} />}
      <p className="mt-3 text-small text-ink2">{rule.basis}</p>
    </Card>
  );
}

/** A hold that is shown as a mind, where a rule may be softened. */
function Softening({ rule, edit }: RuleCardProps<RuleExplained>) {
  if (NEVER_SOFTENED.includes(rule.id))
    return (
      <p className="mt-3 text-small font-medium">
        Its hold is never softened: what it warns of can hurt whoever drinks, or a whole chain.
      </p>
    );
  const canHold = rule.holds !== undefined || edit.draft.limits.jumpHold.value !== null;
  if (!canHold || rule.id === 'unwashed-vessel') return null;
  return (
    <label className={`${CHECK_LABEL} mt-2`}>
      <input
        type="checkbox"
        className={CHECK_BOX}
        checked={edit.draft.softened.includes(rule.id)}
        onChange={(event) => edit.soften(rule.id, event.target.checked)}
      />
      <span>
        Show its hold as a Mind<span className="sr-only"> ({rule.title})</span>
      </span>
    </label>
  );
}
