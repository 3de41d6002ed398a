import clsx from 'clsx';
import type { ReactNode } from 'react';
import { useBrewery } from '../../../app/useBrewery.ts';
import { Button } from '../../../components/ui/Button.tsx';
import { LinkButton } from '../../../components/ui/LinkButton.tsx';
import { useBoardView } from '../view/BoardView.tsx';
import { useBoardPanel } from '../view/useBoardPanel.ts';
import { FirstYeast } from './FirstYeast.tsx';

/** Each person sees the steps that they may take. */
export function FirstSteps() {
  const { can } = useBoardView();
  const { open } = useBoardPanel();
  const { path } = useBrewery();
  return (
    <ol className="grid gap-[18px] px-14 pt-6 pb-8 wide:grid-cols-[1.25fr_1fr_1fr] max-wide:px-7 max-tablet:px-[18px]">
      {can.editYeastsAndVessels && can.editChains && (
        <Step first title="Name the yeast you have">
          <p>Type a strain, or read it off the pack. You can correct everything later.</p>
          <FirstYeast />
        </Step>
      )}
      {can.editBatches && (
        <Step title="Write down the beers">
          <p>Name, gravity, colour and bitterness are enough to check a pour.</p>
          <Button className="mt-3.5" onClick={() => open({ kind: 'new', what: 'batch' })}>
            New batch
          </Button>
        </Step>
      )}
      {can.invite && (
        <Step title="Ask the others in">
          <p>Choose head brewer, brewer or taster for each person.</p>
          <LinkButton className="mt-3.5" to={path('people')}>
            Invite someone
          </LinkButton>
        </Step>
      )}
    </ol>
  );
}

interface StepProps {
  title: string;
  first?: boolean;
  children: ReactNode;
}

function Step({ title, first = false, children }: StepProps) {
  return (
    <li
      className={clsx(
        'flex gap-4 rounded-card px-[22px] py-5 [counter-increment:step]',
        first ? 'border-2 border-bottle bg-white' : 'border-[1.5px] border-line bg-paper',
      )}
    >
      <span
        aria-hidden
        className={clsx(
          'grid size-[38px] shrink-0 place-items-center rounded-full font-display text-[1.1875rem] font-bold before:content-[counter(step)]',
          first ? 'bg-bottle text-on-bottle' : 'bg-cake text-on-cake',
        )}
      />
      <div className="min-w-0 flex-1 text-ink2">
        <h2 className="pt-1.5 pb-1.5 text-shelf text-ink">{title}</h2>
        {children}
      </div>
    </li>
  );
}
