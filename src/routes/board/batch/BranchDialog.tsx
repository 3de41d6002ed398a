import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { z } from 'zod';
import type { Batch } from '#shared/api/batch.ts';
import * as f from '#shared/api/fields.ts';
import { proposeShelf } from '#shared/chain/newShelf.ts';
import { useMove } from '../../../api/moves.ts';
import { newId } from '../../../app/newId.ts';
import { contractResolver } from '../../../components/form/contractResolver.ts';
import { Form } from '../../../components/form/Form.tsx';
import { SelectField } from '../../../components/form/SelectField.tsx';
import { TextField } from '../../../components/form/TextField.tsx';
import { Dialog } from '../../../components/ui/Dialog.tsx';
import { useBoardView } from '../view/BoardView.tsx';
import { useBoardPanel } from '../view/useBoardPanel.ts';

interface BranchDialogProps {
  source: Batch;
  onClose: () => void;
}

const branch = z.strictObject({
  wortId: z.uuid('Choose a wort'),
  name: f.name,
  vesselId: f.id.nullable(),
});
type Branch = z.infer<typeof branch>;

/** A second wort on one cake: a shelf of its own that starts from a part of it. */
export function BranchDialog({ source, onClose }: BranchDialogProps) {
  const { index } = useBoardView();
  const worts = index.bench.filter(({ stage }) => stage === 'pencilled');
  return (
    <Dialog
      open
      onClose={onClose}
      title={`Pour part of ${source.name}’s cake onto another wort`}
      lead="The wort gets a shelf that starts from this cake. How much of it goes where, you say on the link that opens then."
    >
      {worts.length === 0 ? (
        <p>No wort waits on the bench. Add a batch first, then divide the cake.</p>
      ) : (
        <BranchForm source={source} worts={worts} onClose={onClose} />
      )}
    </Dialog>
  );
}

function BranchForm({ source, worts, onClose }: BranchDialogProps & { worts: readonly Batch[] }) {
  const { index } = useBoardView();
  const { open } = useBoardPanel();
  const move = useMove();
  const [id] = useState(newId);
  const yeastId = index.chain(source.chainId ?? '')?.yeastId;
  const first = worts[0]?.id ?? '';
  const form = useForm<Record<string, unknown>, unknown, Branch>({
    defaultValues: {
      wortId: first,
      name: `Branch of ${source.name}`.slice(0, 60),
      vesselId: proposeShelf(index, first, id)?.vesselId ?? null,
    },
    resolver: contractResolver<Record<string, unknown>, Branch>(branch),
  });
  return (
    <Form
      form={form}
      action="Divide the cake"
      busyAction="Dividing"
      onCancel={onClose}
      onSubmit={async ({ wortId, name, vesselId }) => {
        if (!yeastId) return;
        const start = { kind: 'cake', batchId: source.id } as const;
        await move({
          id: newId(),
          batchId: wortId,
          toChainId: 'new',
          afterBatchId: null,
          expectedChainId: null,
          dates: 'pull',
          newChain: { id, name, yeastId, vesselId, start },
        });
        onClose();
        open({ kind: 'link', laterId: wortId });
      }}
    >
      <SelectField
        name="wortId"
        label="Wort from the bench"
        options={worts.map((wort) => ({ value: wort.id, label: wort.name }))}
      />
      <TextField name="name" label="Name of the shelf" autoComplete="off" />
      <SelectField
        name="vesselId"
        label="Vessel"
        none="None yet"
        options={index.board.vessels.map((vessel) => ({ value: vessel.id, label: vessel.name }))}
      />
    </Form>
  );
}
