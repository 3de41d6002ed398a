import { useState } from 'react';
import { batch as batchContract, batchCreate, type Batch } from '#shared/api/batch.ts';
import { useBatchCreate, useBatchPatch } from '../../api/batches.ts';
import { useBoard, useBoardSlug } from '../../api/board.ts';
import { useUnits } from '../../app/useUnits.ts';
import { RowForm } from '../../components/form/RowForm.tsx';
import { TextField } from '../../components/form/TextField.tsx';
import { BrewFields } from './BrewFields.tsx';
import { batchShape, batchValues } from './batchValues.ts';
import { batchLabel, batchWords } from './batchWords.ts';
import { RareFields } from './RareFields.tsx';
import { StyleField } from './StyleField.tsx';
import { TimeFields } from './TimeFields.tsx';
import { lastVolume } from './usual.ts';

export interface BatchFormProps {
  mode: 'new' | 'edit' | 'duplicate';
  /** The batch that is edited or copied. */
  batch?: Batch | null;
  /** Somebody deleted it while it was open. */
  isGone?: boolean;
  /** Told of the batch's id once it is saved. */
  onDone: (id: string) => void;
  onCancel?: () => void;
}

const ACTIONS = { new: 'Put on the bench', edit: 'Save', duplicate: 'Put the copy on the bench' };

export function BatchFormNow({
  mode,
  batch = null,
  isGone = false,
  onDone,
  onCancel,
}: BatchFormProps) {
  const slug = useBoardSlug();
  const board = useBoard();
  const units = useUnits();
  const create = useBatchCreate(slug);
  const patch = useBatchPatch(slug);
  const [values] = useState(() => batchValues(mode, batch, units, { volumeL: lastVolume(board) }));
  const chainId = mode === 'edit' ? (batch?.chainId ?? null) : null;
  return (
    <RowForm
      row={mode === 'edit' ? batch : null}
      isGone={isGone}
      rowSchema={batchContract}
      contract={batchCreate}
      keepsTyped
      values={values}
      shape={batchShape}
      create={create.mutateAsync}
      patch={patch.mutateAsync}
      labelOf={batchLabel}
      wordsOf={(key, facts) => batchWords(key, facts, units, board)}
      action={ACTIONS[mode]}
      {...(onCancel && { onCancel })}
      onDone={onDone}
    >
      <TextField
        name="name"
        label="Name"
        autoComplete="off"
        placeholder="Such as Low Tide Blonde"
      />
      <StyleField />
      <BrewFields chainId={chainId} />
      <TimeFields chainId={chainId} isNew={mode === 'new'} />
      <RareFields />
    </RowForm>
  );
}
