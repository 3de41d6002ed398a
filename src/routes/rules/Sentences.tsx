import { Fragment, type ReactNode } from 'react';
import type { HouseRuleKey } from '#shared/rules/houseRules.ts';
import { lowered } from '../../app/lowered.ts';
import type { Explained } from '../checks/rulesExplained.ts';
import type { Sentence } from './ruleSentences.ts';

interface SentencesProps {
  sentences: readonly Sentence[];
  /** A limit within its sentence: a field, or its words. */
  field: (key: HouseRuleKey, empty: string | undefined) => ReactNode;
}

export function Sentences({ sentences, field }: SentencesProps) {
  return (
    <div className="mt-2 space-y-2">
      {sentences.map((sentence, at) => (
        <p key={at} className="leading-[2.6]">
          {sentence.map((part, place) => (
            <Fragment key={place}>
              {place > 0 && ' '}
              {typeof part === 'string' ? part : field(part.limit, part.empty)}
            </Fragment>
          ))}
          .
        </p>
      ))}
    </div>
  );
}

/** A rule without numbers. */
export const PlainWords = ({ rule }: { rule: Explained }) => (
  <p className="mt-1">
    {rule.looks} {rule.minds && <>A Mind: {lowered(rule.minds)} </>}
    {rule.holds && <>A Hold: {lowered(rule.holds)}</>}
  </p>
);
