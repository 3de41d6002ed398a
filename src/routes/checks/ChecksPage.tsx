import type { ReactNode } from 'react';
import { useTitle } from '../../app/useTitle.ts';
import { VerdictPill } from '../../components/drawn/VerdictPill.tsx';
import { TextLink } from '../../components/ui/TextLink.tsx';
import { PublicHeader } from '../public/PublicHeader.tsx';
import { Cautions } from './Cautions.tsx';
import { RuleBlock } from './RuleBlock.tsx';
import { POUR_EXPLAINED, RULES_EXPLAINED } from './rulesExplained.ts';

export function ChecksPage() {
  useTitle('How the checks work');
  return (
    <>
      <PublicHeader />
      <main
        id="main"
        className="mx-auto max-w-[1000px] px-14 pt-6 pb-20 outline-none max-tablet:px-5"
      >
        <h1 className="text-h0 tracking-[-.03em] outline-none max-tablet:text-[2.25rem]">
          How the checks work
        </h1>
        <p className="mt-3 max-w-2xl text-lead text-ink2">
          One link is the cake of one beer under the wort of the next. Each rule below looks at it;
          the worst answer is the verdict.
        </p>
        <p className="mt-2">
          <TextLink to="/about/science" className="inline-block py-1.5">
            The science: each formula, its source, and an example
          </TextLink>
        </p>
        <Verdicts />
        <WhatIsComputed />
        <h2 className="mt-12 text-[1.75rem] leading-tight">The rules</h2>
        <p className="mt-2 max-w-2xl text-ink2">
          Each limit stands as it is by default. Where no published source was found, it says common
          practice; a value from memory says so.
        </p>
        <div className="mt-5 grid gap-4 wide:grid-cols-2">
          {RULES_EXPLAINED.map((rule) => (
            <RuleBlock key={rule.id} rule={rule} />
          ))}
        </div>
        <h2 className="mt-12 mb-5 text-[1.75rem] leading-tight">On the brew day</h2>
        <RuleBlock rule={POUR_EXPLAINED} />
        <Cautions />
      </main>
    </>
  );
}

function Verdicts() {
  const row = (pill: ReactNode, words: string) => (
    <li className="flex flex-wrap items-center gap-x-4 gap-y-1">
      <span className="w-20 shrink-0">{pill}</span>
      <span className="min-w-0">{words}</span>
    </li>
  );
  return (
    <ul className="mt-6 space-y-3 text-touch">
      {row(<VerdictPill verdict="pour" large />, 'Nothing speaks against it.')}
      {row(
        <VerdictPill verdict="mind" large />,
        'It can be done: know what it does, or do what is advised.',
      )}
      {row(
        <VerdictPill verdict="hold" large />,
        'Not like this. The head brewer may accept some holds, with a reason on the record.',
      )}
    </ul>
  );
}

const COMPUTED = [
  {
    title: 'How much yeast is in the cake',
    text: 'The cells that were pitched and those that grew, by the extract that was fermented; nine in ten settle. The estimate comes with an interval that should hold nine times out of ten; a weighed or counted cake replaces it.',
  },
  {
    title: 'What stays of the earlier beer',
    text: 'Half of the kept cake is beer, and a little lies above it. It is blended into the new wort by volume: gravity, colour and bitterness as poured.',
  },
  {
    title: 'How much of the cake to keep',
    text: 'The part whose low-end estimate still meets the need. The usual rule by weight, 10 to 17 g of slurry a litre, stands beside it (common practice).',
  },
  {
    title: 'What travels down the chain',
    text: 'Allergens, wild cultures and the strongest wort so far are handed on from beer to beer. What is not known is not guessed: the rule is then named as unchecked.',
  },
];

function WhatIsComputed() {
  return (
    <section className="mt-12">
      <h2 className="text-[1.75rem] leading-tight">What is computed</h2>
      <dl className="mt-4 grid gap-x-10 gap-y-5 tablet:grid-cols-2">
        {COMPUTED.map((part) => (
          <div key={part.title}>
            <dt className="font-display text-h3 font-[680]">{part.title}</dt>
            <dd className="mt-1 text-ink2">{part.text}</dd>
          </div>
        ))}
      </dl>
    </section>
  );
}
