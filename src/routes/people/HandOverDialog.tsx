import { useState } from 'react';
import { useHandOver } from '../../api/members.ts';
import { useBrewery } from '../../app/useBrewery.ts';
import { Dialog } from '../../components/ui/Dialog.tsx';
import { say } from '../../components/ui/Toast.tsx';
import { DialogFoot } from './DialogFoot.tsx';
import type { MemberDialogProps } from './RoleDialog.tsx';

const AND_I = [
  { stepDownTo: null, words: 'I stay head brewer as well.' },
  { stepDownTo: 'brewer', words: 'I step down to brewer.' },
  { stepDownTo: 'taster', words: 'I step down to taster.' },
] as const;

/** Makes somebody head brewer and, where wished, oneself less, in one moment. */
export function HandOverDialog({ member, onClose }: MemberDialogProps) {
  const { slug } = useBrewery();
  const hand = useHandOver(slug);
  const [stepDownTo, setStepDownTo] = useState<(typeof AND_I)[number]['stepDownTo']>(null);
  const save = () =>
    hand.mutate(
      { ...member, stepDownTo },
      {
        onSuccess: () => {
          onClose();
          void say(`${member.name} is head brewer now.`);
        },
      },
    );
  return (
    <Dialog
      open
      onClose={onClose}
      title={`Hand over to ${member.name}`}
      lead="They become head brewer: yeasts, vessels, seasons, people and holds are theirs to decide."
    >
      <fieldset className="space-y-1">
        <legend className="mb-1 font-semibold">And you</legend>
        {AND_I.map((each) => (
          <label key={each.words} className="flex min-h-11 items-center gap-2.5">
            <input
              type="radio"
              name="step-down"
              checked={stepDownTo === each.stepDownTo}
              onChange={() => setStepDownTo(each.stepDownTo)}
              className="size-5 shrink-0 accent-bottle"
            />
            {each.words}
          </label>
        ))}
      </fieldset>
      <DialogFoot action="Hand over" change={hand} onDo={save} onClose={onClose} />
    </Dialog>
  );
}
