import type { Batch } from '#shared/api/batch.ts';
import type { Verdict } from '#shared/rules/vocabulary.ts';
import { VerdictMark } from '../../../components/drawn/VerdictMark.tsx';
import { AcceptHold } from '../../board/panel/AcceptHold.tsx';
import { Caution } from '../Caution.tsx';
import { Findings } from '../Findings.tsx';
import { usePourView } from '../pourView.ts';
import { StepFoot } from '../StepFoot.tsx';
import { TONES } from '../words.ts';
import { OtherWays } from '../ways/OtherWays.tsx';
import { CakeCheckLink } from './CakeCheckLink.tsx';

/** What the cake was judged as, and what the link says of it. */
export function CakeStep() {
  const { batch, cakeOf, standing, mine } = usePourView();
  const { link } = standing;
  const others = link?.findings.filter(({ rule }) => rule !== 'cake-check') ?? [];
  if (!cakeOf) return null;
  const judged = judgedOf(cakeOf);
  return (
    <>
      <div
        className={`mt-4 flex max-w-xl items-center gap-3 rounded-xl border-2 px-4 py-3 ${TONES[judged.verdict]}`}
      >
        <VerdictMark verdict={judged.verdict} size={30} />
        <p>
          <b className="text-lead">{judged.title}</b>
          <span className="block text-ink">{judged.because}</span>
        </p>
      </div>
      {mine && <CakeCheckLink cakeOf={cakeOf} />}
      {link && others.length > 0 && (
        <div className="mt-4 max-w-xl">
          <h3 className="mb-3 text-h3">What else the link says</h3>
          <Findings findings={others} laterId={batch.id} />
          <AcceptHold later={batch} answer={link} />
        </div>
      )}
      <Caution>
        Smell and taste the beer before the cake, and pour on no cake whose beer is off.
      </Caution>
      <StepFoot />
      {mine && <OtherWays batch={batch} cakeOf={cakeOf} />}
    </>
  );
}

/** The cake in a word. Nobody has judged it: look first. */
function judgedOf({ cake, name }: Batch): { verdict: Verdict; title: string; because: string } {
  const check = cake?.check ?? null;
  if (cake?.state === 'poured' || cake?.state === 'jarred' || cake?.state === 'dumped')
    return {
      verdict: 'hold',
      title: 'The cake is gone',
      because: `The cake of ${name} is ${cake.state}.`,
    };
  if (!check)
    return {
      verdict: 'mind',
      title: 'Nobody has judged it',
      because: 'Taste the beer, look at the cake, and sign what you found.',
    };
  const taste = check.tasted === 'off' ? 'The beer above it tasted off.' : 'The beer tasted clean.';
  switch (check.judged) {
    case 'fit':
      return { verdict: 'pour', title: 'Fit', because: taste };
    case 'with-care':
      return { verdict: 'mind', title: 'With care', because: taste };
    case 'unfit':
      return { verdict: 'hold', title: 'Unfit', because: taste };
  }
}
