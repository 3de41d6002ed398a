import type { Batch } from '#shared/api/batch.ts';
import { sentenceOf } from '../../api/errors.ts';
import { usePourCommand } from '../../api/pour.ts';
import { newId } from '../../app/newId.ts';
import { VerdictPill } from '../../components/drawn/VerdictPill.tsx';
import { Button } from '../../components/ui/Button.tsx';
import { Notice } from '../../components/ui/Notice.tsx';
import { useBoardView } from '../board/view/BoardView.tsx';
import { countedFindings } from '../board/view/words.ts';
import { Findings } from './Findings.tsx';
import { OtherWays } from './ways/OtherWays.tsx';

/** Before a run: what the link says, and the one button that takes it in hand. */
export function PourStart({ batch, cakeOf }: { batch: Batch; cakeOf: Batch | null }) {
  const { slug, judged, board } = useBoardView();
  const command = usePourCommand(slug, batch.id);
  const link = judged.links.get(batch.id);
  if (batch.stage !== 'pencilled')
    return (
      <Notice className="mt-4">
        {batch.name} is {batch.stage}. Its pour was written down by hand, without a run.
      </Notice>
    );
  return (
    <div className="max-w-xl">
      {link && (
        <>
          <p className="mt-3 mb-3">
            <VerdictPill
              large
              verdict={link.verdict}
              findings={countedFindings(link)}
              unchecked={link.unchecked.length}
            />
          </p>
          <Findings findings={link.findings} laterId={batch.id} />
        </>
      )}
      {!cakeOf && (
        <p className="mt-4 text-ink2">
          This batch is the first of its chain: it is pitched with fresh yeast, at the same
          temperatures.
        </p>
      )}
      <p className="mt-4 text-ink2">
        A pour is taken step by step: the beer racked, the cake looked at, everything clean, the
        wort at its temperature. One person has it in hand; the others see it live.
      </p>
      {board.me.can.setStages ? (
        <Button
          look="first"
          size="large"
          className="mt-4 w-full"
          disabled={command.isPending}
          onClick={() => command.mutate({ kind: 'open', body: { id: newId() } })}
        >
          Begin the pour
        </Button>
      ) : (
        <p className="mt-4 font-semibold">Nobody has begun this pour yet.</p>
      )}
      {command.error && (
        <Notice kind="hold" alert className="mt-3">
          {sentenceOf(command.error)}
        </Notice>
      )}
      {cakeOf && <OtherWays batch={batch} cakeOf={cakeOf} />}
    </div>
  );
}
