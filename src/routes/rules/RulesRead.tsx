import type { HouseRulesRow } from '#shared/api/houseRules.ts';
import { HOUSE_RULES, type HouseRuleKey } from '#shared/rules/houseRules.ts';
import { houseRuleValue } from '#shared/rules/houseRuleWords.ts';
import { useUnits } from '../../app/useUnits.ts';
import { Card, CardTitle } from '../../components/ui/Card.tsx';
import { ALL_EXPLAINED } from '../checks/rulesExplained.ts';
import { RULE_SENTENCES } from './ruleSentences.ts';
import { PlainWords, Sentences } from './Sentences.tsx';

/** The rules as they stand, for whoever does not change them. */
export function RulesRead({ row }: { row: HouseRulesRow }) {
  const { softened = [] } = row.changes;
  return (
    <div className="max-w-4xl space-y-3">
      {ALL_EXPLAINED.map((rule) => {
        const sentences = RULE_SENTENCES[rule.id];
        return (
          <Card key={rule.id}>
            <CardTitle>{rule.title}</CardTitle>
            {sentences ? (
              <Sentences
                sentences={sentences}
                field={(key) => <Limit limit={key} changes={row.changes} />}
              />
            ) : (
              <PlainWords rule={rule} />
            )}
            {softened.some((each) => each === rule.id) && (
              <p className="mt-2 font-medium">Its hold is shown as a Mind in this brewery.</p>
            )}
            <p className="mt-3 text-small text-ink2">{rule.basis}</p>
          </Card>
        );
      })}
    </div>
  );
}

function Limit({ limit, changes }: { limit: HouseRuleKey; changes: HouseRulesRow['changes'] }) {
  const units = useUnits();
  const own = changes[limit];
  const value = own === undefined ? HOUSE_RULES[limit].default : own;
  return (
    <>
      <b className="font-semibold">{houseRuleValue(limit, value, units)}</b>
      {own !== undefined && (
        <span className="text-small text-ink2">
          {' '}
          (by default {houseRuleValue(limit, HOUSE_RULES[limit].default, units)})
        </span>
      )}
    </>
  );
}
