import type { HouseRulesRow } from '#shared/api/houseRules.ts';
import { useUnsaved } from '../../app/unsaved.ts';
import { ALL_EXPLAINED } from '../checks/rulesExplained.ts';
import { Preview } from './Preview.tsx';
import { RuleCard } from './RuleCard.tsx';
import { SaveBar } from './SaveBar.tsx';
import { useLinkChanges } from './useLinkChanges.ts';
import { useRulesDraft } from './useRulesDraft.ts';

/** Every rule with its limits as fields, what they would change on the board, and the way to save. */
export function RulesForm({ row }: { row: HouseRulesRow }) {
  const edit = useRulesDraft(row);
  useUnsaved(edit.isDirty && !edit.isSaving);
  const links = useLinkChanges(edit.changes, edit.isSound);
  return (
    <form
      noValidate
      onSubmit={(event) => {
        event.preventDefault();
        edit.save();
      }}
    >
      <div className="grid items-start gap-5 wide:grid-cols-[minmax(0,1fr)_22rem]">
        <div className="space-y-3">
          {ALL_EXPLAINED.map((rule) => (
            <RuleCard key={rule.id} rule={rule} edit={edit} />
          ))}
        </div>
        <div id="on-this-board" className="scroll-mt-4 wide:sticky wide:top-4">
          <Preview links={links} />
        </div>
      </div>
      <SaveBar edit={edit} changed={links?.length ?? null} />
    </form>
  );
}
