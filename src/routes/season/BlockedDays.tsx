import { useState, type FormEvent } from 'react';
import type { Season } from '#shared/api/brewery.ts';
import { day as dayContract } from '#shared/api/fields.ts';
import { formatDay } from '#shared/units/day.ts';
import { sentenceOf } from '../../api/errors.ts';
import { useOnline } from '../../app/useOnline.ts';
import { FieldError } from '../../components/form/FieldError.tsx';
import { fieldClass } from '../../components/form/fieldClass.ts';
import { Button } from '../../components/ui/Button.tsx';
import { Card, CardTitle } from '../../components/ui/Card.tsx';
import { Notice } from '../../components/ui/Notice.tsx';
import { OFFLINE_SENTENCE } from '../../components/ui/offlineSentence.ts';
import { useBlockedDays } from './useBlockedDays.ts';

/** Days on which nobody brews, whatever the weekday. */
export function BlockedDays({ season }: { season: Season }) {
  const { block, free, isBusy, error } = useBlockedDays(season);
  const online = useOnline();
  return (
    <Card>
      <CardTitle>Blocked days</CardTitle>
      <p className="mt-1 mb-4 text-ink2">
        Holidays, travel, a garage that is let. No brew falls here.
      </p>
      <AddDay days={season.blockedDays} disabled={!online || isBusy} onAdd={block} />
      <div aria-live="polite" className="mt-3 space-y-3 empty:hidden">
        {error ? <Notice kind="hold">{sentenceOf(error)}</Notice> : null}
        {!online && <Notice kind="mind">{OFFLINE_SENTENCE}</Notice>}
      </div>
      {season.blockedDays.length === 0 ? (
        <p className="mt-4 text-ink2">No day is blocked.</p>
      ) : (
        <ul className="mt-4 flex flex-wrap gap-2">
          {season.blockedDays.toSorted().map((day) => (
            <li
              key={day}
              className="flex items-center gap-1 rounded-chip border border-edge bg-white pl-3"
            >
              <span>
                {formatDay(day)} {day.slice(0, 4)}
              </span>
              <Button
                size="small"
                look="text"
                disabled={!online || isBusy}
                onClick={() => free(day)}
                aria-label={`Free ${formatDay(day)}`}
              >
                Free it
              </Button>
            </li>
          ))}
        </ul>
      )}
    </Card>
  );
}

interface AddDayProps {
  days: readonly string[];
  disabled: boolean;
  onAdd: (day: string) => Promise<boolean>;
}

function AddDay({ days, disabled, onAdd }: AddDayProps) {
  const [day, setDay] = useState('');
  const [message, setMessage] = useState<string>();
  const add = async (event: FormEvent) => {
    event.preventDefault();
    if (!dayContract.safeParse(day).success) return setMessage('Choose a day');
    if (days.includes(day)) return setMessage('That day is blocked already');
    setMessage(undefined);
    if (await onAdd(day)) setDay('');
  };
  return (
    <form onSubmit={add} noValidate className="flex flex-wrap items-end gap-3">
      <div className="grow tablet:max-w-56">
        <label htmlFor="blocked-day" className="mb-1 block font-semibold">
          Day
        </label>
        <input
          id="blocked-day"
          type="date"
          value={day}
          onChange={(event) => setDay(event.target.value)}
          aria-invalid={message !== undefined}
          aria-describedby={message ? 'blocked-day-error' : undefined}
          className={fieldClass(message !== undefined)}
        />
      </div>
      <Button type="submit" disabled={disabled} className="min-h-11">
        Block it
      </Button>
      <div className="w-full empty:hidden">
        <FieldError id="blocked-day-error" message={message} />
      </div>
    </form>
  );
}
