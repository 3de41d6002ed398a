import { scienceSectionOf } from '../../app/scienceSections.ts';
import { TextLink } from '../../components/ui/TextLink.tsx';
import { RULES_EXPLAINED } from '../checks/rulesExplained.ts';

/** Rules that compare what is written down with a limit, and compute nothing. */
const WITHOUT_FORMULA = RULES_EXPLAINED.filter(({ id }) => scienceSectionOf(id) === `rule-${id}`);

export function Practice() {
  return (
    <section id="practice" aria-labelledby="practice-title" className="mt-11 scroll-mt-4">
      <h2 id="practice-title" className="text-h2">
        What is no formula
      </h2>
      <p className="mt-1 max-w-2xl text-ink2">
        These rules compare what is written down with a limit, or arithmetic of days. Their limits
        stand under <TextLink to="/about/checks">How the checks work</TextLink>.
      </p>
      <dl className="mt-3 grid gap-x-10 gap-y-4 tablet:grid-cols-2">
        {WITHOUT_FORMULA.map(({ id, title, looks, basis }) => (
          <div key={id} id={scienceSectionOf(id)} className="scroll-mt-4">
            <dt className="font-display text-h3 font-[680]">{title}</dt>
            <dd className="mt-0.5">{looks}</dd>
            <dd className="mt-0.5 text-small text-ink2">Rests on: {basis}</dd>
          </div>
        ))}
      </dl>
    </section>
  );
}
