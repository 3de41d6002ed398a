import { useState } from 'react';
import * as f from '#shared/api/fields.ts';
import type { Typed } from '#shared/api/units.ts';
import { format } from '#shared/units/quantity.ts';
import { newId } from '../../../app/newId.ts';
import { sentenceOf } from '../../../api/errors.ts';
import { useUnsaved } from '../../../app/unsaved.ts';
import { timeOf } from '../../../app/zonedTime.ts';
import { Button } from '../../../components/ui/Button.tsx';
import { Dialog } from '../../../components/ui/Dialog.tsx';
import { Notice } from '../../../components/ui/Notice.tsx';
import { rewrite, written, type Written } from '../../../components/form/written.ts';
import { useBoardView } from '../../board/view/BoardView.tsx';
import { usePourView } from '../pourView.ts';
import { restOf } from '../steps/rest.ts';
import type { DeviceTime } from './deviceTime.ts';
import { ReadBox } from './ReadBox.tsx';

interface PourDialogProps {
  /** The moment of the pour: when its button was pressed. */
  at: DeviceTime;
  cleared: boolean;
  onClose: () => void;
}

/** The pour goes on the record, with what is read of the wort. Readings may be left empty. */
export function PourDialog({ at, cleared, onClose }: PourDialogProps) {
  const { batch } = usePourView();
  const { board } = useBoardView();
  const time = timeOf(Date.parse(at.deviceAt) + at.clockOffsetMs, board.brewery.timeZone);
  return (
    <Dialog open onClose={onClose} title={`${batch.name} is poured`} lead={`At ${time}.`}>
      {!cleared && <WithoutLeave />}
      <PourForm at={at} onDone={onClose} />
    </Dialog>
  );
}

function PourForm({ at, onDone }: { at: DeviceTime; onDone: () => void }) {
  const { run, batch, busy, standing, send } = usePourView();
  const { units } = useBoardView();
  const [id] = useState(newId);
  const [surplusId] = useState(newId);
  const [volume, setVolume] = useState(() => written('volume', null, units));
  const [gravity, setGravity] = useState(() => written('gravity', null, units));
  const [failure, setFailure] = useState<string | null>(null);
  const [tried, setTried] = useState(false);
  useUnsaved((volume.text !== '' || gravity.text !== '') && !busy);
  const faults = {
    volume: faultOf(volume, f.volumeL),
    gravity: faultOf(gravity, f.originalGravity),
  };
  const record = async () => {
    setTried(true);
    if (faults.volume ?? faults.gravity) return;
    const left = standing.link ? restOf(standing.link) : 0;
    const { rest } = run.found;
    try {
      await send({
        kind: 'pour',
        body: {
          runId: run.id,
          id,
          ...at,
          volumeL: volume.value,
          og: gravity.value,
          typed: typedOf(volume, gravity),
          surplus: rest && left > 0 ? { id: surplusId, what: rest, volumeL: left } : null,
        },
      });
      onDone();
    } catch (error) {
      setFailure(sentenceOf(error));
    }
  };
  return (
    <form
      noValidate
      className="grid gap-4"
      onSubmit={(event) => {
        event.preventDefault();
        void record();
      }}
    >
      <ReadBox
        label="Volume in the vessel"
        hint={
          batch.volumeL === null ? undefined : `Planned ${format('volume', batch.volumeL, units)}`
        }
        now={volume}
        fault={tried ? faults.volume : null}
        onText={(text) => setVolume(rewrite(volume, text, units))}
      />
      <ReadBox
        label="Original gravity, as read"
        hint={batch.og === null ? undefined : `Planned ${format('gravity', batch.og, units)}`}
        now={gravity}
        fault={tried ? faults.gravity : null}
        onText={(text) => setGravity(rewrite(gravity, text, units))}
      />
      <p className="text-body text-ink2">Leave a reading empty if you did not take it.</p>
      {failure && (
        <Notice kind="hold" alert>
          {failure}
        </Notice>
      )}
      <Button type="submit" look="first" size="large" disabled={busy}>
        Record the pour
      </Button>
    </form>
  );
}

const WithoutLeave = () => (
  <Notice kind="hold" className="mb-4">
    There is no leave for this pour. It is recorded as that, and stays red until a head brewer signs
    a reason.
  </Notice>
);

type Field = typeof f.volumeL;

function faultOf({ value, why }: Written, field: Field): string | null {
  if (why !== null || value === null) return why;
  return field.safeParse(value).error?.issues[0]?.message ?? null;
}

function typedOf(volume: Written, gravity: Written): Typed {
  const typed: Typed = {};
  if (volume.value !== null && volume.typed) typed.volumeL = volume.typed;
  if (gravity.value !== null && gravity.typed) typed.og = gravity.typed;
  return typed;
}
