import { useState } from 'react';
import { useForm } from 'react-hook-form';
import type { Batch } from '#shared/api/batch.ts';
import { cakeCheckWrite, type CakeCheck, type CakeCheckWrite } from '#shared/api/cakeCheck.ts';
import { useCakeCheck } from '../../../api/batchRecord.ts';
import { contractResolver } from '../../../components/form/contractResolver.ts';
import { Form } from '../../../components/form/Form.tsx';
import { say } from '../../../components/ui/Toast.tsx';
import { useBoardView } from '../../board/view/BoardView.tsx';
import { CheckFields } from './CheckFields.tsx';
import { checkShape, checkValues } from './checkValues.ts';

interface CakeCheckFormProps {
  batch: Batch;
  check: CakeCheck | null;
  onDone: () => void;
  onCancel?: () => void;
}

/** The judgement of a cake as the beer comes off it. What is measured replaces the estimate. */
export function CakeCheckForm({ batch, check, onDone, onCancel }: CakeCheckFormProps) {
  const { slug, units, board } = useBoardView();
  const { sign } = useCakeCheck(slug, batch.id);
  // What stood when it was opened: a judgement that came since is not written over unseen.
  const [version] = useState(check?.version ?? 0);
  const form = useForm({
    defaultValues: checkValues(check, units),
    resolver: contractResolver<Record<string, unknown>, CakeCheckWrite>(cakeCheckWrite, {
      typed: true,
      shape: checkShape,
    }) as never,
  });
  const me = board.members.find(({ personId }) => personId === board.me.personId);
  return (
    <Form
      form={form}
      action="Save the check"
      {...(onCancel && { onCancel })}
      onSubmit={async (body: CakeCheckWrite) => {
        await sign.mutateAsync({ version, body });
        say(`The cake of ${batch.name} is judged.`);
        onDone();
      }}
    >
      <CheckFields signer={me?.name ?? 'You'} />
    </Form>
  );
}
