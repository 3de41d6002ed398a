import { useEffect, useEffectEvent, useState } from 'react';
import { useForm } from 'react-hook-form';
import type { Batch } from '#shared/api/batch.ts';
import { cakeCheckWrite, type CakeCheck, type CakeCheckWrite } from '#shared/api/cakeCheck.ts';
import { JUDGED_WORDS } from '#shared/record/readings.ts';
import { useCakeCheck } from '../../../api/batchRecord.ts';
import { contractResolver } from '../../../components/form/contractResolver.ts';
import { Form } from '../../../components/form/Form.tsx';
import { Button } from '../../../components/ui/Button.tsx';
import { Notice } from '../../../components/ui/Notice.tsx';
import { say } from '../../../components/ui/Toast.tsx';
import { useBoardView } from '../../board/view/BoardView.tsx';
import { CheckFields } from './CheckFields.tsx';
import { checkShape, checkValues } from './checkValues.ts';

interface CakeCheckFormProps {
  batch: Batch;
  check: CakeCheck | null;
  /** Something stands in it that is not saved. */
  onWritten: () => void;
  onDone: () => void;
  onCancel?: () => void;
}

type Values = ReturnType<typeof checkValues>;

/** The judgement of a cake as the beer comes off it. What is measured replaces the estimate. */
export function CakeCheckForm({ batch, check, onWritten, onDone, onCancel }: CakeCheckFormProps) {
  const { slug, units, board } = useBoardView();
  const { sign } = useCakeCheck(slug, batch.id);
  // What stood when it was opened: a judgement that came since is not written over unseen.
  const [version, setVersion] = useState(check?.version ?? 0);
  const form = useForm<Values, unknown, CakeCheckWrite>({
    defaultValues: checkValues(check, units),
    resolver: contractResolver<Values, CakeCheckWrite>(cakeCheckWrite, {
      typed: true,
      shape: checkShape,
    }),
  });
  const { isDirty } = form.formState;
  const tell = useEffectEvent(onWritten);
  useEffect(() => {
    if (isDirty) tell();
  }, [isDirty]);
  const since = check !== null && check.version !== version ? check : null;
  const me = board.members.find(({ personId }) => personId === board.me.personId);
  return (
    <Form
      form={form}
      action="Save the check"
      {...(onCancel && { onCancel })}
      onSubmit={async (body) => {
        await sign.mutateAsync({ version, body });
        say(`The cake of ${batch.name} is judged.`);
        onDone();
      }}
    >
      {since && <JudgedSince check={since} onOver={() => setVersion(since.version)} />}
      <CheckFields signer={me?.name ?? 'You'} />
    </Form>
  );
}

/** Somebody judged it while the form was open: what is written stays, and nothing is lost unseen. */
function JudgedSince({ check, onOver }: { check: CakeCheck; onOver: () => void }) {
  return (
    <Notice kind="mind" alert>
      <p>
        {check.signedBy.name} judged it {JUDGED_WORDS[check.judged]} in the meantime.
      </p>
      <Button size="small" className="mt-2" onClick={onOver}>
        Write mine in its place
      </Button>
    </Notice>
  );
}
