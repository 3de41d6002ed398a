import { useId } from 'react';
import { HOUSE_RULE_WORDS } from '#shared/rules/houseRuleWords.ts';
import type { HouseRuleKey } from '#shared/rules/houseRules.ts';
import { capital } from '#shared/rules/words.ts';
import { FieldError } from '../../components/form/FieldError.tsx';
import { fieldClass } from '../../components/form/fieldClass.ts';
import type { Written } from '../../components/form/written.ts';
import { unitWord } from './limitWords.ts';

interface LimitFieldProps {
  limit: HouseRuleKey;
  now: Written;
  fault: string | undefined;
  /** What an empty field means. */
  empty: string | undefined;
  onType: (text: string) => void;
}

/** A number within its sentence, its fault right under it. */
export function LimitField({ limit, now, fault, empty, onType }: LimitFieldProps) {
  const id = useId();
  const unit = unitWord(limit, now.unit);
  return (
    <span className="my-0.5 inline-block max-w-full align-middle leading-snug">
      <span className="inline-flex items-center gap-1.5">
        <input
          type="text"
          inputMode="decimal"
          autoComplete="off"
          name={limit}
          aria-label={[capital(HOUSE_RULE_WORDS[limit]), unit].filter(Boolean).join(', ')}
          aria-invalid={fault !== undefined}
          aria-describedby={fault === undefined ? undefined : id}
          value={now.text}
          placeholder={empty}
          onChange={(event) => onType(event.target.value)}
          className={fieldClass(
            fault !== undefined,
            'max-w-20 scroll-mb-48 text-center font-semibold',
          )}
        />
        {unit && <span className="whitespace-nowrap">{unit}</span>}
      </span>
      <FieldError id={id} message={fault} />
    </span>
  );
}
