import { useEffect, useId, useMemo } from 'react';
import { useLocation, useSearchParams } from 'react-router-dom';
import type { UnitPrefs } from '#shared/api/units.ts';
import type { LinkInput } from '#shared/rules/linkInput.ts';
import { workingsOf } from '#shared/science/workings.ts';
import { fieldClass } from '../../components/form/fieldClass.ts';
import { Practice } from './Practice.tsx';
import { SectionBlock } from './SectionBlock.tsx';
import { SECTIONS } from './sections/all.ts';

/** A link whose figures may be put into the formulas. */
export interface Choice {
  id: string;
  earlier: string;
  later: string;
  input: LinkInput;
}

interface ScienceProps {
  choices: readonly Choice[];
  units: UnitPrefs;
  /** What is said where there is no link to choose. */
  without: string;
}

/** Every formula behind a verdict, with the figures of one link in it. */
export function Science({ choices, units, without }: ScienceProps) {
  const [params, setParams] = useSearchParams();
  const chosen = choices.find(({ id }) => id === params.get('link')) ?? choices[0];
  const work = useMemo(
    () =>
      chosen && {
        ...workingsOf(chosen.input),
        earlier: chosen.earlier,
        later: chosen.later,
        units,
      },
    [chosen, units],
  );
  useHash();
  return (
    <>
      {chosen ? (
        <LinkChoice
          choices={choices}
          chosen={chosen}
          onChoose={(link) => setParams({ link }, { replace: true, preventScrollReset: true })}
        />
      ) : (
        <p className="mt-5 rounded-xl border-[1.5px] border-dashed border-edge px-4 py-3 text-ink2">
          {without}
        </p>
      )}
      <Contents />
      {SECTIONS.map((section) => (
        <SectionBlock key={section.id} section={section} work={work} />
      ))}
      <Practice />
    </>
  );
}

/** The part that the address names is brought into sight once it is there. */
function useHash() {
  const { hash } = useLocation();
  useEffect(() => {
    if (hash !== '') document.getElementById(hash.slice(1))?.scrollIntoView();
  }, [hash]);
}

interface LinkChoiceProps {
  choices: readonly Choice[];
  chosen: Choice;
  onChoose: (id: string) => void;
}

function LinkChoice({ choices, chosen, onChoose }: LinkChoiceProps) {
  const id = useId();
  return (
    <div className="mt-5 max-w-xl">
      <label htmlFor={id} className="mb-1 block font-semibold">
        Worked with the figures of
      </label>
      <select
        id={id}
        value={chosen.id}
        onChange={(event) => onChoose(event.target.value)}
        className={fieldClass(false)}
      >
        {choices.map((choice) => (
          <option key={choice.id} value={choice.id}>
            {choice.later} onto {choice.earlier}
          </option>
        ))}
      </select>
    </div>
  );
}

function Contents() {
  return (
    <nav aria-label="Formulas" className="mt-5 border-y border-line py-2 print:hidden">
      <ul className="flex flex-wrap gap-x-5 gap-y-0.5">
        {[...SECTIONS, { id: 'practice', title: 'What is no formula' }].map(({ id, title }) => (
          <li key={id}>
            <a
              href={`#${id}`}
              className="inline-block py-1 font-medium underline underline-offset-4 hover:text-bottle max-tablet:py-2.5"
            >
              {title}
            </a>
          </li>
        ))}
      </ul>
    </nav>
  );
}
