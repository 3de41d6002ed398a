import type { Notice } from '#shared/fermentation/seen.ts';
import { VerdictMark } from '../../../components/drawn/VerdictMark.tsx';
import { VERDICT_WORDS } from '../../../components/drawn/verdictWords.ts';

/** Something that a fermentation should not do: the fact, why, what to do, and whose rule it is. */
export function NoticeBlock({ notice }: { notice: Notice }) {
  const isGrave = notice.id === 'stuck' || notice.id === 'too-low';
  const verdict = isGrave ? 'hold' : 'mind';
  const tone = isGrave ? 'text-hold' : 'text-mind';
  const ground = isGrave ? 'border-hold bg-hold-l' : 'border-mind bg-mind-l';
  return (
    <section
      aria-label={notice.title}
      className={`mb-3 flex gap-3 rounded-xl border-[1.5px] px-4 py-3 ${ground}`}
    >
      <span className={`mt-0.5 shrink-0 ${tone}`}>
        <VerdictMark verdict={verdict} size={20} />
      </span>
      <div className="min-w-0 leading-snug">
        <h3 className={`font-bold ${tone}`}>
          <span className="sr-only">{VERDICT_WORDS[verdict]}: </span>
          {notice.title}
        </h3>
        <p>{notice.because}</p>
        <p className="font-medium">{notice.do}</p>
        <p className="mt-1 text-small text-ink2">{notice.basis}</p>
      </div>
    </section>
  );
}
