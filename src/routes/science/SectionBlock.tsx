import { unbroken } from '../../app/unbroken.ts';
import type { Figure, ScienceSection, Work } from './section.ts';

interface SectionBlockProps {
  section: ScienceSection;
  /** Absent: there is no link whose figures could be put in. */
  work: Work | undefined;
}

/** One formula: set out, with one's own figures in it, whose it is, how far it may be out. */
export function SectionBlock({ section, work }: SectionBlockProps) {
  const { id, title, lead, formula, source, interval, limits, figures } = section;
  return (
    <section
      id={id}
      aria-labelledby={`${id}-title`}
      className="mt-9 scroll-mt-4 break-inside-avoid wide:grid wide:grid-cols-[minmax(0,1fr)_22rem] wide:gap-x-10"
    >
      <div className="min-w-0">
        <h2 id={`${id}-title`} className="text-h2">
          {title}
        </h2>
        <p className="mt-1">{lead}</p>
        <div className="[&>p:not([role])]:mt-1 [&>p:not([role])]:text-ink2">{formula}</div>
        <dl className="mt-3 space-y-1.5">
          <Note name="Source" text={source} />
          <Note name="How sure" text={interval} />
          <Note name="Where it does not hold" text={limits} />
        </dl>
      </div>
      {work && <Figures title={title} figures={figures(work)} />}
    </section>
  );
}

function Note({ name, text }: { name: string; text: string }) {
  return (
    <div>
      <dt className="inline font-semibold">{name}: </dt>
      <dd className="inline text-ink2">{unbroken(text)}</dd>
    </div>
  );
}

function Figures({ title, figures }: { title: string; figures: readonly Figure[] }) {
  return (
    <table className="mt-4 w-full self-start rounded-card border-separate border-spacing-0 border-[1.5px] border-line bg-paper px-4 py-2 wide:mt-1">
      <caption className="sr-only">{title}: the figures put in, and what comes out</caption>
      <tbody>
        {figures.map(({ what, value, id, isResult }, row) => (
          <tr
            key={id ?? row}
            className={`align-top *:py-1.5 not-first:*:border-t not-first:*:border-line2 ${isResult ? 'font-bold' : ''}`}
          >
            <th scope="row" className={`pr-3 text-left ${isResult ? '' : 'font-normal text-ink2'}`}>
              {what}
            </th>
            <td data-figure={id} className="text-right wrap-anywhere">
              {value === null ? (
                <span className="font-normal text-ink2">not known</span>
              ) : (
                unbroken(value)
              )}
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}
