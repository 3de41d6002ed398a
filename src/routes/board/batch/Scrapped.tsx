import { useState } from 'react';
import type { Batch } from '#shared/api/batch.ts';
import { sentenceOf } from '../../../api/errors.ts';
import { useStage } from '../../../api/links.ts';
import { Swatch } from '../../../components/drawn/Swatch.tsx';
import { Button } from '../../../components/ui/Button.tsx';
import { Dialog } from '../../../components/ui/Dialog.tsx';
import { Notice } from '../../../components/ui/Notice.tsx';
import { focusBatch } from '../lift/inSight.ts';
import { useBoardView } from '../view/BoardView.tsx';

/** The batches that went wrong, folded away behind how many they are. */
export function Scrapped() {
  const { scrapped } = useBoardView().index;
  const [isOpen, setOpen] = useState(false);
  if (scrapped.length === 0) return null;
  return (
    <>
      <Button look="quiet" size="small" aria-haspopup="dialog" onClick={() => setOpen(true)}>
        {scrapped.length} scrapped
      </Button>
      <Dialog
        open={isOpen}
        onClose={() => setOpen(false)}
        title="Scrapped this season"
        lead="They stay on the record. Their cakes are poured on no more."
      >
        <ul className="divide-y divide-line border-t border-line">
          {scrapped.map((batch) => (
            <ScrappedBatch key={batch.id} batch={batch} isLast={scrapped.length === 1} />
          ))}
        </ul>
      </Dialog>
    </>
  );
}

function ScrappedBatch({ batch, isLast }: { batch: Batch; isLast: boolean }) {
  const { slug, can } = useBoardView();
  const stage = useStage(slug);
  const putBack = () => {
    const wish = { id: batch.id, version: batch.version, change: { stage: 'pencilled' as const } };
    // With the last one this list and its button go: the focus follows the batch to the bench.
    const follow = () => isLast && focusBatch(batch.id);
    stage.mutateAsync(wish).then(follow, () => undefined);
  };
  return (
    <li className="flex flex-wrap items-center gap-x-3 gap-y-2 py-3">
      <Swatch srm={batch.srm} size="glass" />
      <div className="min-w-48 flex-1 wrap-anywhere">
        <p className="font-bold">
          {batch.name} <span className="font-normal text-ink2">{batch.style}</span>
        </p>
        <p className="text-small text-ink2">{batch.scrapReason || 'No reason was written down.'}</p>
      </div>
      {can.setStages && (
        <Button
          size="small"
          disabled={stage.isPending}
          aria-label={`Put ${batch.name} back on the bench`}
          onClick={putBack}
        >
          Put back on the bench
        </Button>
      )}
      {stage.error && (
        <Notice kind="hold" alert className="w-full">
          {sentenceOf(stage.error)}
        </Notice>
      )}
    </li>
  );
}
