import { Notice } from '../components/ui/Notice.tsx';
import { useOutbox } from './useOutbox.ts';

const sentence = (words: string) => (/[.?]$/.test(words) ? words : `${words}.`);

/** Across every page while something that was written was not taken. */
export function StoppedStrip() {
  const first = useOutbox()[0];
  if (!first?.refusal) return null;
  return (
    <div className="px-7 pt-3 max-tablet:px-[18px] print:hidden">
      <Notice kind="hold">
        <span className="font-semibold">Not taken: {first.what}.</span>{' '}
        {sentence(first.refusal.sentence)} What you wrote after it waits. Open “1 not taken” at the
        top to choose.
      </Notice>
    </div>
  );
}
