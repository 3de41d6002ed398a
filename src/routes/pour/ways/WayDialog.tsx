import { useState } from 'react';
import type { Batch } from '#shared/api/batch.ts';
import { formatDay } from '#shared/units/day.ts';
import { sentenceOf } from '../../../api/errors.ts';
import { Button } from '../../../components/ui/Button.tsx';
import { Dialog } from '../../../components/ui/Dialog.tsx';
import { Notice } from '../../../components/ui/Notice.tsx';
import { useBoardView } from '../../board/view/BoardView.tsx';
import { useTakeWay } from './useTakeWay.ts';
import { WayFacts } from './WayFacts.tsx';
import type { Way } from './ways.ts';

interface WayDialogProps {
  way: Way;
  title: string;
  batch: Batch;
  onClose: () => void;
}

/** What this way changes, named before it is taken. */
export function WayDialog({ way, title, batch, onClose }: WayDialogProps) {
  const { index } = useBoardView();
  const take = useTakeWay(batch);
  const [busy, setBusy] = useState(false);
  const [failure, setFailure] = useState<string | null>(null);
  const go = async () => {
    setBusy(true);
    try {
      await take(way);
      onClose();
    } catch (error) {
      setFailure(sentenceOf(error));
      setBusy(false);
    }
  };
  return (
    <Dialog open onClose={onClose} title={title}>
      <WayFacts way={way} />
      {way.moves.length > 0 && (
        <p className="mt-3 text-ink2">
          {way.moves.length === 1
            ? `${batch.name} gets a shelf of its own.`
            : `${batch.name} and the ${way.moves.length - 1} behind it get a shelf of their own.`}
        </p>
      )}
      {way.shifted.length > 0 && (
        <ul className="mt-3 grid gap-1 text-touch">
          {way.shifted.map(({ batchId, from, to }) => (
            <li key={batchId}>
              <b>{index.batch(batchId)?.name}</b>: {from ? formatDay(from) : 'no date'} to{' '}
              {to ? formatDay(to) : 'no date'}
            </li>
          ))}
        </ul>
      )}
      {failure && (
        <Notice kind="hold" alert className="mt-3">
          {failure}
        </Notice>
      )}
      <Button
        look="first"
        size="large"
        className="mt-5 w-full"
        disabled={busy}
        onClick={() => void go()}
      >
        Do it so
      </Button>
    </Dialog>
  );
}
