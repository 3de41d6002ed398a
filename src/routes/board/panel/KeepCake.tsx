import { overstepOf } from '#shared/chain/shares.ts';
import { overstepWords } from '#shared/chain/shareWords.ts';
import { fieldSentenceOf, sentenceOf } from '../../../api/errors.ts';
import { VerdictPill } from '../../../components/drawn/VerdictPill.tsx';
import { Button } from '../../../components/ui/Button.tsx';
import { Notice } from '../../../components/ui/Notice.tsx';
import { useBoardView } from '../view/BoardView.tsx';
import { countedFindings } from '../view/words.ts';
import { InlineQuantity } from './InlineQuantity.tsx';
import { KeepBar } from './KeepBar.tsx';
import { enoughWords, measuredWords, surplusWords, thumbWords } from './keepWords.ts';
import { PanelPart } from './PanelFrame.tsx';
import type { Kept, LinkDraft } from './useLinkDraft.ts';
import { useSaveKept, type SaveKept } from './useSaveKept.ts';

/** How much of the cake to keep: tried live, stored when the hand lets go. */
export function KeepCake({ draft }: { draft: LinkDraft }) {
  const { board, units, can } = useBoardView();
  const { answer, later } = draft;
  const { save, error } = useSaveKept(draft);
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
  const notes = [
    measuredWords(draft.earlier, units),
    enoughWords(answer),
    surplusWords(answer),
    thumbWords(answer, units),
  ];
  return (
    <PanelPart title="How much cake to keep">
      <KeepBar
        answer={answer}
        kept={kept}
        {...(mayChange && { onTry: draft.tryKept, onKeep: (litres: number) => save(litres, null) })}
      />
      {draft.isTrying && (
        <p className="mt-2">
          <VerdictPill verdict={answer.verdict} findings={countedFindings(answer)} />
        </p>
      )}
      {mayChange && (
        <div className="mt-2 flex flex-wrap items-end gap-2">
          <div className="w-28">
            <InlineQuantity
              kind="smallVolume"
              label="Kept part"
              value={kept}
              typed={later.link.typed.keepL}
              refuse={(litres) => {
                const over = overstepOf(board, later.id, litres);
                return over && overstepWords(over, units);
              }}
              onSave={(value, typed) => save(value ?? 'recommended', typed)}
            />
          </div>
          <KeepChoices kept={draft.kept} save={save} />
        </div>
      )}
      {error && (
        <Notice kind="hold" alert className="mt-2">
          {fieldSentenceOf(error) ?? sentenceOf(error)}
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

function KeepChoices({ kept, save }: { kept: Kept; save: SaveKept }) {
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
