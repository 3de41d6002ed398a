import { useState } from 'react';
import { useOnline } from '../../app/useOnline.ts';
import { Button } from '../../components/ui/Button.tsx';
import { ConfirmDialog } from '../../components/ui/ConfirmDialog.tsx';
import { Notice } from '../../components/ui/Notice.tsx';
import { OFFLINE_SENTENCE } from '../../components/ui/OfflineBanner.tsx';
import type { RulesEdit } from './useRulesDraft.ts';

/** Stays at the foot of the window while the rules are changed. */
export function SaveBar({ edit }: { edit: RulesEdit }) {
  const online = useOnline();
  const [asks, setAsks] = useState(false);
  const own = Object.keys(edit.changes).length;
  if (!edit.isDirty && own === 0) return null;
  return (
    <div className="sticky bottom-0 z-20 -mx-7 mt-5 space-y-3 border-t border-line bg-paper px-7 py-3 max-tablet:bottom-18 max-tablet:-mx-[18px] max-tablet:px-[18px]">
      <div aria-live="assertive" className="space-y-3 empty:hidden">
        {edit.failure && <Notice kind="hold">{edit.failure}</Notice>}
        {edit.theirs && <Conflict edit={edit} />}
        {!online && <Notice kind="mind">{OFFLINE_SENTENCE}</Notice>}
      </div>
      <div className="flex flex-wrap items-center justify-end gap-3">
        {own > 0 && (
          <Button look="quiet" className="mr-auto" onClick={() => setAsks(true)}>
            All back to the defaults
          </Button>
        )}
        {edit.isDirty && (
          <>
            <Button look="quiet" onClick={edit.leave}>
              Leave it
            </Button>
            <Button type="submit" look="first" disabled={!online || edit.isSaving}>
              {edit.isSaving ? 'Saving …' : 'Save the house rules'}
            </Button>
          </>
        )}
      </div>
      <ConfirmDialog
        open={asks}
        onClose={() => setAsks(false)}
        title="All back to the defaults?"
        action="Fill in the defaults"
        onConfirm={() => {
          edit.resetAll();
          setAsks(false);
        }}
      >
        <p>Every limit is filled in as it is by default, and no hold is softened.</p>
        <p>You see what that changes on the board before you save it.</p>
      </ConfirmDialog>
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
