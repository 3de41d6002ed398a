import { useId } from 'react';
import type { Batch, LinkPatch } from '#shared/api/batch.ts';
import { day } from '#shared/api/fields.ts';
import type { Typed } from '#shared/api/units.ts';
import { formatDay } from '#shared/units/day.ts';
import { format } from '#shared/units/quantity.ts';
import { sentenceOf } from '../../../api/errors.ts';
import { useLinkPatch } from '../../../api/links.ts';
import { CHECK_BOX, CHECK_LABEL } from '../../../components/form/CheckField.tsx';
import { fieldClass } from '../../../components/form/fieldClass.ts';
import { Notice } from '../../../components/ui/Notice.tsx';
import { useBoardView } from '../view/BoardView.tsx';
import { InlineQuantity } from './InlineQuantity.tsx';

/** The rare facts of a link, folded away: when the yeast is taken, what stands above it, a starter. */
export function LinkFacts({ later }: { later: Batch }) {
  const { can } = useBoardView();
  return (
    <details className="border-t border-line py-[13px]">
      <summary className="text-[1.03125rem] font-[680] font-display tracking-[-0.02em]">
        More about this pour
      </summary>
      {can.editBatches ? <EditFacts later={later} /> : <ReadFacts later={later} />}
    </details>
  );
}

function EditFacts({ later }: { later: Batch }) {
  const { slug } = useBoardView();
  const { mutate, error } = useLinkPatch(slug);
  const { link } = later;
  const save = (patch: LinkPatch) => mutate({ id: later.id, version: later.version, patch });
  const saveNumber =
    (field: 'leftAboveL' | 'cakeC') => (value: number | null, typed: Typed[string] | null) => {
      const { [field]: _, ...others } = link.typed;
      save({ [field]: value, typed: typed ? { ...others, [field]: typed } : others });
    };
  return (
    <div className="mt-2 grid gap-3">
      <TakenOn value={link.takenOn} onSave={(takenOn) => save({ takenOn })} />
      <InlineQuantity
        kind="smallVolume"
        label="Beer left above the cake"
        value={link.leftAboveL}
        typed={link.typed.leftAboveL}
        onSave={saveNumber('leftAboveL')}
      />
      <InlineQuantity
        kind="temperature"
        label="The cake waits at"
        value={link.cakeC}
        typed={link.typed.cakeC}
        onSave={saveNumber('cakeC')}
      />
      <label className={CHECK_LABEL}>
        <input
          type="checkbox"
          className={CHECK_BOX}
          checked={link.starter}
          onChange={(event) => save({ starter: event.target.checked })}
        />
        <span className="font-medium">A starter is made from the waiting cake</span>
      </label>
      {error && (
        <Notice kind="hold" alert>
          {sentenceOf(error)}
        </Notice>
      )}
    </div>
  );
}

function TakenOn({
  value,
  onSave,
}: {
  value: string | null;
  onSave: (day: string | null) => void;
}) {
  const id = useId();
  return (
    <div>
      <label htmlFor={id} className="mb-1 block text-small font-semibold">
        Yeast taken on, if not at racking
      </label>
      <input
        id={id}
        type="date"
        key={value}
        defaultValue={value ?? ''}
        onBlur={(event) => {
          const next = event.target.value === '' ? null : event.target.value;
          const isDay = next === null || day.safeParse(next).success;
          if (isDay && next !== value) onSave(next);
        }}
        className={fieldClass(false)}
      />
    </div>
  );
}

function ReadFacts({ later }: { later: Batch }) {
  const { units } = useBoardView();
  const { takenOn, leftAboveL, cakeC, starter } = later.link;
  const lines = [
    takenOn === null ? 'Yeast taken at racking' : `Yeast taken on ${formatDay(takenOn)}`,
    ...(leftAboveL === null
      ? []
      : [`${format('smallVolume', leftAboveL, units)} of beer left above`]),
    ...(cakeC === null ? [] : [`The cake waits at ${format('temperature', cakeC, units)}`]),
    starter ? 'With a starter' : 'No starter',
  ];
  return (
    <ul className="mt-2 text-ink2">
      {lines.map((line) => (
        <li key={line}>{line}</li>
      ))}
    </ul>
  );
}
