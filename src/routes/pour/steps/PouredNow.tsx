import { format } from '#shared/units/quantity.ts';
import { timeOf } from '../../../app/zonedTime.ts';
import { VerdictMark } from '../../../components/drawn/VerdictMark.tsx';
import { useBoardView } from '../../board/view/BoardView.tsx';
import { usePourView } from '../pourView.ts';
import { useOutbox } from '../../../outbox/useOutbox.ts';
import { ReasonForm } from '../wort/ReasonForm.tsx';
import { TONES } from '../words.ts';

/** What the record says of this pour. One without leave stays red until a head brewer signs. */
export function PouredNow() {
  const { run, batch, send, busy } = usePourView();
  const { board, units, can } = useBoardView();
  const waiting = useOutbox();
  const { pour } = run;
  if (!pour) return null;
  const open = !pour.cleared && pour.signedAt === null;
  const isSent = !waiting.some(({ id }) => id === pour.id);
  const verdict = open ? 'hold' : pour.cleared ? 'pour' : 'mind';
  const facts = [
    timeOf(pour.at, board.brewery.timeZone),
    ...(pour.readingC === null ? [] : [format('temperature', pour.readingC, units)]),
    ...(pour.volumeL === null ? [] : [format('volume', pour.volumeL, units)]),
    ...(pour.og === null ? [] : [format('gravity', pour.og, units)]),
  ];
  return (
    <section className={`mt-4 rounded-xl border-2 px-4 py-3 ${TONES[verdict]}`}>
      <div className="flex items-center gap-3">
        <VerdictMark verdict={verdict} size={30} />
        <p>
          <b className="text-lead">
            {pour.cleared ? `${batch.name} is poured` : `${batch.name} was poured without leave`}
          </b>
          <span className="block text-ink">
            {facts.join(' · ')}, by {pour.by.name}
          </span>
        </p>
      </div>
      {!isSent && (
        <p className="mt-2 text-ink">
          Not sent yet. It waits on this device, and is judged by its own time once it arrives.
        </p>
      )}
      {!pour.cleared &&
        pour.findings.map(({ rule, because }) => (
          <p key={rule} className="mt-2 text-ink">
            {because}
          </p>
        ))}
      {pour.signedBy && (
        <p className="mt-2 text-ink">
          <b>{pour.signedBy.name}:</b> {pour.reason}
        </p>
      )}
      {open &&
        isSent &&
        (can.acceptHolds ? (
          <ReasonForm
            label="Your reason. It stays on the record."
            action="Sign it"
            busy={busy}
            onReason={(reason) => send({ kind: 'sign', body: { runId: run.id, reason } })}
          />
        ) : (
          <p className="mt-2 text-ink">It stays red until a head brewer signs a reason.</p>
        ))}
    </section>
  );
}
