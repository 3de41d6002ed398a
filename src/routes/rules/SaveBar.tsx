import { useOnline } from '../../app/useOnline.ts';
import { Button } from '../../components/ui/Button.tsx';
import { Notice } from '../../components/ui/Notice.tsx';
import { OFFLINE_SENTENCE } from '../../components/ui/offlineSentence.ts';
import type { RulesEdit } from './useRulesDraft.ts';

interface SaveBarProps {
  edit: RulesEdit;
  /** Links of the board that would be judged otherwise; null: not known. */
  changed: number | null;
}

/** Stays at the foot of the window while the rules are changed. */
export function SaveBar({ edit, changed }: SaveBarProps) {
  const online = useOnline();
  const own = Object.keys(edit.changes).length;
  if (!edit.isDirty && own === 0) return null;
  return (
    <div className="sticky bottom-0 z-20 -mx-7 mt-5 space-y-3 border-t border-line bg-paper px-7 py-3 max-tablet:bottom-18 max-tablet:-mx-[18px] max-tablet:px-[18px]">
      <div aria-live="assertive" className="space-y-3 empty:hidden">
        {edit.failure && <Notice kind="hold">{edit.failure}</Notice>}
        {edit.theirs && <Conflict edit={edit} />}
        {!online && <Notice kind="mind">{OFFLINE_SENTENCE}</Notice>}
      </div>
      {changed !== null && changed > 0 && (
        <p className="text-small wide:hidden">
          <a href="#on-this-board" className="font-medium underline underline-offset-4">
            {changed === 1 ? '1 link' : `${changed} links`} on this board would change
          </a>
        </p>
      )}
      <div className="flex flex-wrap items-center justify-end gap-3">
        {own > 0 && (
          <Button look="quiet" className="mr-auto" onClick={edit.resetAll}>
            All back to the defaults
          </Button>
        )}
        {edit.isDirty && (
          <>
            <Button look="quiet" onClick={edit.leave}>
              Leave it
            </Button>
            <Button type="submit" look="first" disabled={!online || edit.isSaving}>
              {edit.isSaving ? 'Saving …' : 'Save'}
            </Button>
          </>
        )}
      </div>
    </div>
  );
}

function Conflict({ edit }: { edit: RulesEdit }) {
  return (
    <Notice kind="mind">
      <p>Somebody saved other house rules in the meantime: {edit.theirs?.history[0]?.what}.</p>
      <p className="mt-3 flex flex-wrap gap-3">
        <Button size="small" onClick={edit.takeTheirs}>
          Take theirs
        </Button>
        <Button size="small" onClick={edit.saveOver}>
          Save mine over theirs
        </Button>
      </p>
    </Notice>
  );
}
