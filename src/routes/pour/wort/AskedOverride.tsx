import { askedOverride } from '#shared/pour/leave.ts';
import { format } from '#shared/units/quantity.ts';
import { VerdictMark } from '../../../components/drawn/VerdictMark.tsx';
import { useBoardView } from '../../board/view/BoardView.tsx';
import { usePourView } from '../pourView.ts';
import { ago, TONES } from '../words.ts';
import { ReasonForm } from './ReasonForm.tsx';

/** A question for the head brewer, seen wherever the run is open. */
export function AskedOverride() {
  const { run, now, standing, busy, send } = usePourView();
  const { can, units } = useBoardView();
  const asked = run.state === 'open' ? askedOverride(run) : null;
  if (!asked || !can.acceptHolds) return null;
  const holds = asked.findings.filter(({ verdict }) => verdict === 'hold');
  const answer = (how: 'granted' | 'refused') => (reason: string) =>
    send({
      kind: 'answer',
      body: { runId: run.id, clearanceId: asked.id, answer: how, reason },
    });
  const { readingC } = standing.wort;
  return (
    <section className={`mt-4 max-w-xl rounded-xl border-2 px-4 py-3 ${TONES.hold}`}>
      <div className="flex items-center gap-3">
        <VerdictMark verdict="hold" size={30} />
        <p>
          <b className="text-lead">{asked.askedBy.name} asks to pour all the same</b>
          <span className="block text-ink">
            {ago(Date.parse(asked.askedAt), now)}
            {readingC === null ? '' : `, the wort at ${format('temperature', readingC, units)} now`}
          </span>
        </p>
      </div>
      {holds.map(({ rule, because }) => (
        <p key={rule} className="mt-2 text-ink">
          {because}
        </p>
      ))}
      <ReasonForm
        label="Your reason. It stays on the record."
        action="Let it be poured"
        busy={busy}
        onReason={answer('granted')}
        other={{ action: 'Refuse', onReason: answer('refused') }}
      />
    </section>
  );
}
