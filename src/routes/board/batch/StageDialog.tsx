import { useForm } from 'react-hook-form';
import { stageRequest, type Batch, type StageRequest } from '#shared/api/batch.ts';
import { useStage } from '../../../api/links.ts';
import { contractResolver } from '../../../components/form/contractResolver.ts';
import { DayField } from '../../../components/form/DayField.tsx';
import { Form } from '../../../components/form/Form.tsx';
import { NoteField } from '../../../components/form/NoteField.tsx';
import { QuantityField } from '../../../components/form/QuantityField.tsx';
import { Dialog } from '../../../components/ui/Dialog.tsx';
import { say } from '../../../components/ui/Toast.tsx';
import { useBoardView } from '../view/BoardView.tsx';
import { stageLine } from '../view/words.ts';
import { STAGE_ACTIONS, type NextStage } from './stages.ts';
import { stageValues } from './stageValues.ts';

interface StageDialogProps {
  batch: Batch;
  to: NextStage;
  onClose: () => void;
}

/** A change of stage by hand; asks for what was read. */
export function StageDialog({ batch, to, onClose }: StageDialogProps) {
  const { slug, board, index, units } = useBoardView();
  const { mutateAsync } = useStage(slug);
  const form = useForm({
    defaultValues: stageValues(batch, to, board.today, index, units),
    resolver: contractResolver<Record<string, unknown>, StageRequest>(stageRequest),
  });
  const { title, action } = STAGE_ACTIONS[to];
  return (
    <Dialog open onClose={onClose} title={`${title}: ${batch.name}`} lead={LEADS[to]}>
      <Form
        form={form}
        action={action}
        onCancel={onClose}
        onSubmit={async (change) => {
          const now = await mutateAsync({ id: batch.id, version: batch.version, change });
          say(`${now.name}: ${stageLine(now, board.today)}`);
          onClose();
        }}
      >
        <StageFields to={to} />
        {CAUTIONS[to] && <p className="text-small text-ink2">{CAUTIONS[to]}</p>}
      </Form>
    </Dialog>
  );
}

const LEADS: Record<NextStage, string> = {
  pencilled: 'It becomes a plan again and may be moved. What was read is forgotten.',
  fermenting: 'It then stays where it was poured. Leave a reading empty if you did not take it.',
  racked:
    'Its cake lies bare from then on, so pour soon or keep it cold. Leave a reading empty if you did not take it.',
  scrapped: 'It leaves its shelf and stays on the record. Its cake is not poured on.',
};

/** The usual caution of the hour, in one sentence or two. */
const CAUTIONS: Partial<Record<NextStage, string>> = {
  fermenting:
    'Hot wort burns, shatters cold glass and kills yeast: chill it first. Lid on, blow-off tube, never a blocked airlock.',
  racked:
    'Carbon dioxide lies low: open the door of a cellar, closet or chest freezer before leaning in. Never seal what may still ferment.',
  scrapped: 'Dumped cake and spent hops are dangerous to dogs.',
};

function StageFields({ to }: { to: NextStage }) {
  switch (to) {
    case 'pencilled':
      return null;
    case 'fermenting':
      return (
        <>
          <DayField name="brewedOn" label="Brewed on" />
          <QuantityField name="volumeL" label="Volume in the vessel" />
          <QuantityField name="og" label="Original gravity, as read" />
        </>
      );
    case 'racked':
      return (
        <>
          <DayField name="rackedOn" label="Racked on" />
          <QuantityField name="volumeL" label="Volume of beer" />
          <QuantityField name="fg" label="Final gravity, as read" />
        </>
      );
    case 'scrapped':
      return <NoteField name="reason" label="What went wrong" />;
  }
}
