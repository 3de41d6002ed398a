import { useState } from 'react';
import { format } from '#shared/units/quantity.ts';
import { askedOverride } from '#shared/pour/leave.ts';
import { newId } from '../../../app/newId.ts';
import { timeOf } from '../../../app/zonedTime.ts';
import { Button } from '../../../components/ui/Button.tsx';
import { Notice } from '../../../components/ui/Notice.tsx';
import { useBoardView } from '../../board/view/BoardView.tsx';
import { usePourView } from '../pourView.ts';
import { deviceTime, type DeviceTime } from './deviceTime.ts';
import { PourDialog } from './PourDialog.tsx';
import { ReasonForm } from './ReasonForm.tsx';

/** The pour button with leave, and what there is without. */
export function PourNow() {
  const { leave, mine } = usePourView();
  const { board } = useBoardView();
  const [pressed, setPressed] = useState<{ at: DeviceTime; cleared: boolean } | null>(null);
  // Leave may end while the form stands open: what counts is the moment of the pour.
  const press = () => setPressed({ at: deviceTime(), cleared: leave !== null });
  if (!mine) return null;
  return (
    <div className="mt-3">
      {leave ? (
        <>
          <Button look="first" size="large" className="min-h-15 w-full text-lead!" onClick={press}>
            Pour now
          </Button>
          <p className="mt-1.5 text-body text-ink2">
            {leave.kind === 'override' && leave.answeredBy
              ? `${leave.answeredBy.name} lets it: ${leave.reason}. `
              : ''}
            Leave holds until {leave.expiresAt && timeOf(leave.expiresAt, board.brewery.timeZone)}.
          </p>
        </>
      ) : (
        <Locked onPoured={press} />
      )}
      {pressed && <PourDialog {...pressed} onClose={() => setPressed(null)} />}
    </div>
  );
}

/** No leave: why, whom to ask, and the record of what happened all the same. */
function Locked({ onPoured }: { onPoured: () => void }) {
  const { standing } = usePourView();
  const { units, online } = useBoardView();
  const { readingC, window: pourWindow } = standing.wort;
  const until =
    standing.linkHolds.length > 0 || readingC === null
      ? ''
      : readingC > pourWindow.maxC
        ? ` until ${format('temperature', pourWindow.maxC, units)}`
        : readingC < pourWindow.minC
          ? ` until ${format('temperature', pourWindow.minC, units)}`
          : '';
  return (
    <>
      <p className="grid min-h-15 place-items-center rounded-xl bg-line2 px-4 text-center text-lead font-bold text-ink2">
        Pour is locked{until}
      </p>
      {online ? <Override /> : <NoneCanClear />}
      <p className="mt-3 -ml-4">
        <Button look="text" onClick={onPoured}>
          It is poured already: record it
        </Button>
      </p>
    </>
  );
}

/** Leave is the server's to give: what a pour without it means, before it is made. */
const NoneCanClear = () => (
  <Notice kind="mind" className="mt-3">
    Without a connection nothing can give leave to pour, and nobody can be asked. Leave that was
    given before holds for its time. If you pour all the same, write it down: it is judged by its
    own time once it arrives, and the record shows it as poured without leave, red until a head
    brewer signs a reason.
  </Notice>
);

function Override() {
  const { run, standing, busy, send } = usePourView();
  const { can } = useBoardView();
  const asked = askedOverride(run);
  const refused = run.clearances.findLast(({ kind }) => kind === 'override');
  const ask = (reason: string | null) =>
    send({ kind: 'ask', body: { runId: run.id, id: newId(), reason } });
  if (asked && !can.acceptHolds)
    return (
      <Notice kind="mind" className="mt-3">
        The head brewer is asked. The answer shows here as soon as it is given.
      </Notice>
    );
  if (!standing.overridable || asked) return <NeverWords />;
  return (
    <>
      {refused?.answer === 'refused' && refused.answeredBy && (
        <Notice kind="hold" className="mt-3">
          {refused.answeredBy.name} refused: {refused.reason}
        </Notice>
      )}
      {can.acceptHolds ? (
        <details className="mt-3">
          <summary className="min-h-11 cursor-pointer py-2.5 font-medium">
            Pour all the same, with a reason
          </summary>
          <ReasonForm
            label="Your reason. It stays on the record."
            action="Let it be poured"
            busy={busy}
            onReason={ask}
          />
        </details>
      ) : (
        <>
          <Button
            size="large"
            className="mt-3 w-full"
            disabled={busy}
            onClick={() => void ask(null).catch(() => undefined)}
          >
            Ask the head brewer
          </Button>
          <p className="mt-1.5 text-body text-ink2">
            A head brewer can let it be poured all the same, with a reason that stays on the record.
          </p>
        </>
      )}
    </>
  );
}

function NeverWords() {
  const { standing } = usePourView();
  const rules = [
    ...standing.wort.findings.map(({ rule }): string => rule),
    ...standing.linkHolds.map(({ rule }) => rule),
  ];
  if (rules.includes('kills-yeast'))
    return <p className="mt-2 text-touch">Wort this hot kills the yeast. Nobody overrides that.</p>;
  if (rules.includes('allergen') || rules.includes('wild-culture'))
    return (
      <p className="mt-2 text-touch">
        Nobody overrides an allergen or a wild culture: declare it on this batch, or do not pour.
      </p>
    );
  return null;
}
