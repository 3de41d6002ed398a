import { Printer, Thermometer } from 'lucide-react';
import { useIsGuestHere } from '../../../api/board.ts';
import { useBrewery } from '../../../app/useBrewery.ts';
import { LinkButton } from '../../../components/ui/LinkButton.tsx';
import { FoldedTalk } from '../../talk/FoldedTalk.tsx';
import { useBoardView } from '../view/BoardView.tsx';
import { useBoardPanel } from '../view/useBoardPanel.ts';
import { AcceptHold } from './AcceptHold.tsx';
import { Advice } from './Advice.tsx';
import { BlendTable } from './BlendTable.tsx';
import { FindingBlock } from './FindingBlock.tsx';
import { KeepCake } from './KeepCake.tsx';
import { LinkFacts } from './LinkFacts.tsx';
import { LinkTitle } from './LinkTitle.tsx';
import { PanelFrame } from './PanelFrame.tsx';
import { PassedChecks } from './PassedChecks.tsx';
import { UncheckedFields } from './UncheckedFields.tsx';
import { useLinkDraft } from './useLinkDraft.ts';

/** One link opened: the verdict first and large, the reason next, the remedy last. */
export function LinkPanel({ laterId }: { laterId: string }) {
  const { close } = useBoardPanel();
  const { index } = useBoardView();
  const later = index.batch(laterId);
  const earlier = later ? index.predecessor(laterId) : null;
  if (!later || !earlier)
    return (
      <PanelFrame label="Link" onClose={close}>
        <h2 className="text-h2">There is no such link any more</h2>
        <p className="mt-2 text-ink2">The batch was moved, or it comes first on its shelf.</p>
      </PanelFrame>
    );
  return <OpenedLink key={laterId} laterId={laterId} earlierId={earlier.id} />;
}

function OpenedLink({ laterId, earlierId }: { laterId: string; earlierId: string }) {
  const { close } = useBoardPanel();
  const isGuest = useIsGuestHere();
  const { path } = useBrewery();
  const draft = useLinkDraft(laterId, earlierId);
  if (!draft) return null;
  const { earlier, later, answer } = draft;
  return (
    <PanelFrame label={`${later.name} onto ${earlier.name}`} onClose={close}>
      <LinkTitle earlier={earlier} later={later} answer={answer} accepted={draft.accepted} />
      <BlendTable earlier={earlier} later={later} answer={answer} />
      {answer.findings.map((finding) => (
        <FindingBlock
          key={finding.rule}
          finding={finding}
          science={isGuest ? '/about/science' : path(`science?link=${later.id}`)}
        />
      ))}
      {!draft.isTrying && <AcceptHold later={later} answer={answer} />}
      <KeepCake draft={draft} />
      <UncheckedFields earlier={earlier} later={later} unchecked={answer.unchecked} />
      <Advice advice={answer.advice} />
      <PassedChecks passed={answer.passed} />
      <LinkFacts later={later} />
      {!isGuest && (
        <p className="flex flex-wrap gap-2.5 border-t border-line pt-3 pb-1">
          {later.stage === 'pencilled' && (
            <LinkButton size="small" look="first" to={path(`pour/${later.id}`)}>
              <Thermometer size={16} aria-hidden />
              Pour check
            </LinkButton>
          )}
          <LinkButton size="small" look="quiet" to={path(`print/brew-sheets/${later.id}`)}>
            <Printer size={16} aria-hidden />
            Brew sheet
          </LinkButton>
        </p>
      )}
      {!isGuest && later.chainId !== null && (
        <FoldedTalk chainId={later.chainId} about={{ kind: 'link', batchId: later.id }} />
      )}
    </PanelFrame>
  );
}
