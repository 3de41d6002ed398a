import { Printer } from 'lucide-react';
import type { ReactNode } from 'react';
import { formatDay } from '#shared/units/day.ts';
import { useTitle } from '../../app/useTitle.ts';
import { Button } from '../../components/ui/Button.tsx';
import { TextLink } from '../../components/ui/TextLink.tsx';
import { useBoardView } from '../board/view/BoardView.tsx';
import { PAPERS, usePageRules, usePaper, type PaperName } from './paper.ts';

interface PaperPageProps {
  title: string;
  /** The page that it was opened from. */
  back: { to: string; name: string };
  /** What else may be chosen. */
  options?: ReactNode;
  children: ReactNode;
}

/** A page for the printer, shown on the screen as it will be on paper. */
export function PaperPage({ title, back, options, children }: PaperPageProps) {
  const { board } = useBoardView();
  const [paper, choose] = usePaper();
  useTitle(`Print ${title}`);
  usePageRules(paper, {
    left: `${board.brewery.name} · ${board.season.name}`,
    right: `Printed ${formatDay(board.today)} ${board.today.slice(0, 4)}`,
  });
  return (
    <main id="main" className="grow bg-stone px-7 pb-16 outline-none max-tablet:px-2 print:p-0">
      <div className="mx-auto flex max-w-[900px] flex-wrap items-center gap-x-5 gap-y-3 py-4 max-tablet:px-2.5 print:hidden">
        <TextLink to={back.to} className="py-2.5">
          {back.name}
        </TextLink>
        <span className="grow" />
        {options}
        <PaperChoice paper={paper} onChoose={choose} />
        <Button look="first" onClick={() => window.print()}>
          <Printer size={17} aria-hidden />
          Print
        </Button>
      </div>
      <article
        className="paper mx-auto max-w-full shadow-card print:w-auto! print:shadow-none"
        style={{ width: PAPERS[paper].width }}
      >
        {children}
      </article>
    </main>
  );
}

interface PaperChoiceProps {
  paper: PaperName;
  onChoose: (paper: PaperName) => void;
}

function PaperChoice({ paper, onChoose }: PaperChoiceProps) {
  return (
    <fieldset className="inline-flex overflow-hidden rounded-field border-[1.5px] border-edge bg-white">
      <legend className="sr-only">Paper</legend>
      {(Object.keys(PAPERS) as PaperName[]).map((name) => (
        <label
          key={name}
          className="grid min-h-9 cursor-pointer place-items-center border-edge px-4 not-first-of-type:border-l-[1.5px] has-checked:bg-bottle has-checked:font-semibold has-checked:text-on-bottle has-focus-visible:outline-3 has-focus-visible:-outline-offset-4 has-focus-visible:outline-current max-tablet:min-h-11"
        >
          <input
            type="radio"
            name="paper"
            checked={name === paper}
            onChange={() => onChoose(name)}
            className="sr-only"
          />
          {PAPERS[name].name}
        </label>
      ))}
    </fieldset>
  );
}
