import { sentenceOf } from '../../../api/errors.ts';
import { useLinkPatch } from '../../../api/links.ts';
import { Button } from '../../../components/ui/Button.tsx';
import { Notice } from '../../../components/ui/Notice.tsx';
import { useBoardView } from '../view/BoardView.tsx';
import { InlineQuantity } from './InlineQuantity.tsx';
import { KeepBar } from './KeepBar.tsx';
import { enoughWords, surplusWords, thumbWords } from './keepWords.ts';
import { PanelPart } from './PanelFrame.tsx';
import type { Kept, LinkDraft } from './useLinkDraft.ts';
import type { Typed } from '#shared/api/units.ts';

/** How much of the cake to keep: tried live, stored when the hand lets go. */
export function KeepCake({ draft }: { draft: LinkDraft }) {
  const { units, can } = useBoardView();
  const { answer, later } = draft;
  const { save, patch } = useSaveKept(draft);
  const { volumeL: whole } = answer.cake;
  if (whole === null)
    return (
      <PanelPart title="How much cake to keep">
        <p className="mt-1 text-ink2">
          The cake cannot be estimated before volume and gravities of {draft.earlier.name} are
          known.
        </p>
      </PanelPart>
    );
  const kept = answer.keep.keptL ?? whole;
  const mayChange = can.editBatches && later.stage === 'pencilled';
  const notes = [enoughWords(answer), surplusWords(answer), thumbWords(answer, units)];
  return (
    <PanelPart title="How much cake to keep">
      <KeepBar
        answer={answer}
        kept={kept}
        {...(mayChange && { onTry: draft.tryKept, onKeep: (litres: number) => save(litres, null) })}
      />
      {mayChange && (
        <div className="mt-2 flex flex-wrap items-end gap-2">
          <div className="w-28">
            <InlineQuantity
              kind="smallVolume"
              label="Kept part"
              value={kept}
              typed={later.link.typed.keepL}
              onSave={(value, typed) => save(value ?? 'recommended', typed)}
            />
          </div>
          <KeepChoices kept={draft.kept} save={save} />
        </div>
      )}
      {patch.error && (
        <Notice kind="hold" alert className="mt-2">
          {sentenceOf(patch.error)}
        </Notice>
      )}
      {notes.map(
        (note) =>
          note && (
            <p key={note} className="mt-2 text-ink2">
              {note}
            </p>
          ),
      )}
    </PanelPart>
  );
}

type Save = (kept: Kept, typed: Typed[string] | null) => void;

function KeepChoices({ kept, save }: { kept: Kept; save: Save }) {
  return (
    <>
      <Button
        size="small"
        look="quiet"
        disabled={kept === 'recommended'}
        onClick={() => save('recommended', null)}
      >
        Recommended
      </Button>
      <Button
        size="small"
        look="quiet"
        disabled={kept === 'whole'}
        onClick={() => save('whole', null)}
      >
        Keep all
      </Button>
    </>
  );
}

function useSaveKept({ later, tryKept }: LinkDraft) {
  const { slug } = useBoardView();
  const patch = useLinkPatch(slug);
  const save: Save = (kept, typed) => {
    tryKept(kept);
    const { keepL: _, ...others } = later.link.typed;
    patch.mutate(
      {
        id: later.id,
        version: later.version,
        patch: {
          keepL: typeof kept === 'number' ? kept : null,
          keepWhole: kept === 'whole',
          typed: typed ? { ...others, keepL: typed } : others,
        },
      },
      { onSuccess: () => tryKept(null) },
    );
  };
  return { save, patch };
}
