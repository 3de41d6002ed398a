import type { Notice } from '#shared/fermentation/seen.ts';
import { VerdictMark } from '../../../components/drawn/VerdictMark.tsx';

/** Something that a fermentation should not do: the fact, why, what to do, and whose rule it is. */
export function NoticeBlock({ notice }: { notice: Notice }) {
  const isGrave = notice.id === 'stuck' || notice.id === 'too-low';
  const tone = isGrave ? 'border-hold bg-hold-l' : 'border-mind bg-mind-l';
  return (
    <section
      aria-label={notice.title}
      className={`mb-3 flex gap-3 rounded-xl border-[1.5px] px-4 py-3 ${tone}`}
    >
      <span className={`mt-0.5 shrink-0 ${isGrave ? 'text-hold' : 'text-mind'}`}>
        <VerdictMark verdict={isGrave ? 'hold' : 'mind'} size={20} />
      </span>
      <div className="min-w-0 leading-snug">
        <h3 className={`font-bold ${isGrave ? 'text-hold' : 'text-mind'}`}>{notice.title}</h3>
        <p>{notice.because}</p>
        <p className="font-medium">{notice.do}</p>
        <p className="mt-1 text-small text-ink2">{notice.basis}</p>
      </div>
    </section>
  );
}
