import { useState } from 'react';
import type { Batch } from '#shared/api/batch.ts';
import type { BatchRecord } from '#shared/api/reading.ts';
import { formatDay } from '#shared/units/day.ts';
import { useCakeCheck } from '../../../api/batchRecord.ts';
import { sentenceOf } from '../../../api/errors.ts';
import { KeptOffline } from '../../../app/keptOffline.ts';
import { lazyPart } from '../../../app/lazyPart.tsx';
import { Button } from '../../../components/ui/Button.tsx';
import { ConfirmDialog } from '../../../components/ui/ConfirmDialog.tsx';
import { Skeleton } from '../../../components/ui/Skeleton.tsx';
import { say } from '../../../components/ui/Toast.tsx';
import { OnWholeBoard, useBoardView } from '../../board/view/BoardView.tsx';
import { CheckSummary } from './CheckSummary.tsx';

const CakeCheckForm = lazyPart(
  async () => (await import('./CakeCheckForm.tsx')).CakeCheckForm,
  <Skeleton rows={4} label="Opening the form" />,
);
const StageDialog = lazyPart(
  async () => (await import('../../board/batch/StageDialog.tsx')).StageDialog,
);

interface CakeCheckPanelProps {
  batch: Batch;
  record: BatchRecord;
}

/** Racking, and the judgement of the cake: the form, or what was signed. */
export function CakeCheckPanel({ batch, record }: CakeCheckPanelProps) {
  const { board, can, mayWriteDown: mayWrite } = useBoardView();
  const { check } = record;
  // A form in which something is written stays open when somebody else judges the cake.
  const [isWriting, setWriting] = useState(false);
  return (
    <aside
      aria-label="Racking and cake check"
      className="w-[404px] shrink-0 border-l border-line bg-paper px-6 pt-5 pb-10 max-wide:w-auto max-wide:border-t max-wide:border-l-0 max-tablet:px-[18px] print:hidden"
    >
      <h2 className="font-display text-shelf font-bold tracking-[-.02em]">
        Racking and cake check
      </h2>
      <p className="mt-0.5 mb-4 text-small text-ink2">
        {batch.cake === null
          ? 'There is no cake to judge until it is brewed.'
          : `${formatDay(batch.read.rackedOn ?? board.today)}, as the beer comes off the cake.`}
      </p>
      {batch.stage === 'fermenting' && can.setStages && <RackButton batch={batch} />}
      {batch.cake !== null &&
        (check && !isWriting ? (
          <>
            <CheckSummary check={check} />
            {mayWrite && (
              <div className="mt-4 flex flex-wrap gap-3">
                <Button onClick={() => setWriting(true)}>Judge it anew</Button>
                <WithdrawButton
                  batch={batch}
                  version={check.version}
                  onDone={() => setWriting(false)}
                />
              </div>
            )}
          </>
        ) : mayWrite ? (
          <CakeCheckForm
            batch={batch}
            check={check}
            onWritten={() => setWriting(true)}
            onDone={() => setWriting(false)}
            {...(check && { onCancel: () => setWriting(false) })}
          />
        ) : (
          <p className="text-ink2">Nobody has judged its cake yet.</p>
        ))}
    </aside>
  );
}

function RackButton({ batch }: { batch: Batch }) {
  const [isOpen, setOpen] = useState(false);
  return (
    <>
      <Button className="mb-5 w-full" onClick={() => setOpen(true)}>
        Rack the beer
      </Button>
      {isOpen && (
        <OnWholeBoard>
          <KeptOffline value={false}>
            <StageDialog batch={batch} to="racked" onClose={() => setOpen(false)} />
          </KeptOffline>
        </OnWholeBoard>
      )}
    </>
  );
}

interface WithdrawButtonProps {
  batch: Batch;
  version: number;
  onDone: () => void;
}

function WithdrawButton({ batch, version, onDone }: WithdrawButtonProps) {
  const { slug } = useBoardView();
  const { withdraw } = useCakeCheck(slug, batch.id);
  const [isAsking, setAsking] = useState(false);
  return (
    <>
      <Button look="quiet" onClick={() => setAsking(true)}>
        Take it back
      </Button>
      <ConfirmDialog
        open={isAsking}
        onClose={() => setAsking(false)}
        title="Take the judgement back"
        action="Take it back"
        busy={withdraw.isPending}
        // The judgement goes from the page at once, and this with it: a refusal is told all the same.
        onConfirm={() =>
          void withdraw
            .mutateAsync(version)
            .then(onDone, (error: unknown) => say(sentenceOf(error)))
        }
      >
        <p>The cake of {batch.name} is then as if nobody had judged or measured it.</p>
      </ConfirmDialog>
    </>
  );
}
