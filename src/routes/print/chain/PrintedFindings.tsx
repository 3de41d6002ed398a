import type { Course, CourseStep } from '#shared/chain/course.ts';
import { useBoardView } from '../../board/view/BoardView.tsx';
import { PaperMark } from '../PaperVerdict.tsx';
import { PaperFinding } from '../sheet/SheetFindings.tsx';

/** What each link says, why, and what to do. */
export function PrintedFindings({ course: { steps } }: { course: Course }) {
  if (steps.length === 0) return null;
  return (
    <section className="mt-5">
      <h2 className="break-after-avoid text-[1.3em]">What the links say</h2>
      {steps.map((step) => (
        <StepFindings key={step.laterId} step={step} />
      ))}
    </section>
  );
}

function StepFindings({ step: { laterId, earlierId, link } }: { step: CourseStep }) {
  const { index } = useBoardView();
  const acceptance = index.batch(laterId)?.link.acceptance;
  return (
    <div className="mt-2 break-inside-avoid border-t border-line pt-1">
      <h3 className="text-[1.08em] leading-tight">
        {index.batch(laterId)?.name} onto {index.batch(earlierId)?.name}
      </h3>
      {link.findings.length === 0 ? (
        <p>
          <PaperMark link={link} />: nothing speaks against it.
        </p>
      ) : (
        link.findings.map((finding) => <PaperFinding key={finding.rule} finding={finding} />)
      )}
      {link.accepted && acceptance && (
        <p>
          <b>Accepted by {acceptance.by}:</b> {acceptance.reason}
        </p>
      )}
    </div>
  );
}
