import { useId, useState } from 'react';
import { acceptanceRequest, type Acceptance, type Batch } from '#shared/api/batch.ts';
import { holdsOf, mayBeAccepted, NEVER_ACCEPTED } from '#shared/chain/acceptance.ts';
import type { LinkAnswer } from '#shared/rules/answer.ts';
import { sentenceOf } from '../../../api/errors.ts';
import { useAcceptance } from '../../../api/links.ts';
import { useUnsaved } from '../../../app/unsaved.ts';
import { FieldError } from '../../../components/form/FieldError.tsx';
import { fieldClass } from '../../../components/form/fieldClass.ts';
import { Button } from '../../../components/ui/Button.tsx';
import { Notice } from '../../../components/ui/Notice.tsx';
import { useBoardView } from '../view/BoardView.tsx';
import { PanelPart } from './PanelFrame.tsx';

interface AcceptHoldProps {
  later: Batch;
  answer: LinkAnswer;
}

/** A hold may be taken on by the head brewer, with a reason, and never for every kind of hold. */
export function AcceptHold({ later, answer }: AcceptHoldProps) {
  const { can } = useBoardView();
  const { acceptance } = later.link;
  if (acceptance) return <Accepted later={later} acceptance={acceptance} />;
  if (answer.verdict !== 'hold') return null;
  if (!mayBeAccepted(answer)) return <NeverAccepted answer={answer} />;
  if (!can.acceptHolds)
    return (
      <PanelPart title="Pour it all the same">
        <p className="mt-1 text-ink2">
          Only a head brewer accepts a hold, with a reason that stays on the record.
        </p>
      </PanelPart>
    );
  return <AcceptForm later={later} />;
}

const WAYS_OUT: Record<string, string> = {
  allergen: 'Declare the allergen on this batch, or do not pour it onto this cake.',
  'wild-culture': 'Declare the culture on this batch, or do not pour it onto this cake.',
  headspace: 'Use a larger vessel or make less wort: an overfull vessel bursts or overflows.',
};

function NeverAccepted({ answer }: { answer: LinkAnswer }) {
  const kinds = holdsOf(answer).filter((rule) => NEVER_ACCEPTED.includes(rule));
  return (
    <PanelPart title="This hold cannot be accepted">
      {kinds.map((rule) => (
        <p key={rule} className="mt-1 text-ink2">
          {WAYS_OUT[rule]}
        </p>
      ))}
    </PanelPart>
  );
}

function AcceptForm({ later }: { later: Batch }) {
  const { slug } = useBoardView();
  const accept = useAcceptance(slug);
  const id = useId();
  const [reason, setReason] = useState('');
  const [why, setWhy] = useState<string>();
  useUnsaved(reason.trim() !== '' && !accept.isPending && !accept.isSuccess);
  const submit = () => {
    const parsed = acceptanceRequest.safeParse({ reason });
    setWhy(parsed.error?.issues[0]?.message);
    if (parsed.success) accept.mutate({ id: later.id, version: later.version, reason });
  };
  return (
    <PanelPart title="Pour it all the same">
      <form
        className="mt-1"
        onSubmit={(event) => {
          event.preventDefault();
          submit();
        }}
      >
        <label htmlFor={id} className="block text-ink2">
          Your reason. It stays on the record, and lapses when a fact of this link changes.
        </label>
        <textarea
          id={id}
          rows={2}
          value={reason}
          onChange={(event) => setReason(event.target.value)}
          aria-invalid={why !== undefined}
          aria-describedby={`${id}-why`}
          className={fieldClass(why !== undefined, 'mt-1')}
        />
        <FieldError id={`${id}-why`} message={why} />
        {accept.error && (
          <Notice kind="hold" alert className="mt-2">
            {sentenceOf(accept.error)}
          </Notice>
        )}
        <Button type="submit" className="mt-2" disabled={accept.isPending}>
          Accept the hold
        </Button>
      </form>
    </PanelPart>
  );
}

function Accepted({ later, acceptance }: { later: Batch; acceptance: Acceptance }) {
  const { slug, can } = useBoardView();
  const remove = useAcceptance(slug);
  return (
    <PanelPart title="Accepted">
      <p className="mt-1 text-ink2">
        <b className="text-ink">{acceptance.by}:</b> {acceptance.reason}
      </p>
      {can.acceptHolds && (
        <Button
          size="small"
          look="quiet"
          className="mt-2"
          disabled={remove.isPending}
          onClick={() => remove.mutate({ id: later.id, version: later.version, reason: null })}
        >
          Take it back
        </Button>
      )}
      {remove.error && (
        <Notice kind="hold" alert className="mt-2">
          {sentenceOf(remove.error)}
        </Notice>
      )}
    </PanelPart>
  );
}
