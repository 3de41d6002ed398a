import type { Person } from '#shared/api/people.ts';
import type { UnitPrefs } from '#shared/api/units.ts';
import { sentenceOf } from '../../api/errors.ts';
import { useOnline } from '../../app/useOnline.ts';
import { Notice } from '../../components/ui/Notice.tsx';
import { OFFLINE_SENTENCE } from '../../components/ui/offlineSentence.ts';
import { Choice } from './Choice.tsx';
import { useAccountChange } from './useAccountChange.ts';

export function UnitChoices({ me }: { me: Person }) {
  const change = useAccountChange(me);
  const online = useOnline();
  const units: UnitPrefs = { ...me.units, ...change.variables?.units };
  const shown = change.isPending ? units : me.units;
  const set = (part: Partial<UnitPrefs>) => change.mutate({ units: { ...shown, ...part } });
  const common = { disabled: !online };
  return (
    <div className="space-y-4">
      <Choice
        {...common}
        label="Volumes and weights"
        name="system"
        value={shown.system}
        options={[
          { value: 'metric', label: 'Litres, grams' },
          { value: 'us', label: 'US gallons, ounces' },
        ]}
        onChoose={(system) => set({ system })}
      />
      <Choice
        {...common}
        label="Gravity"
        name="gravity"
        value={shown.gravity}
        options={[
          { value: 'sg', label: 'SG' },
          { value: 'plato', label: '°P' },
        ]}
        onChoose={(gravity) => set({ gravity })}
      />
      <Choice
        {...common}
        label="Colour"
        name="colour"
        value={shown.colour}
        options={[
          { value: 'srm', label: 'SRM' },
          { value: 'ebc', label: 'EBC' },
        ]}
        onChoose={(colour) => set({ colour })}
      />
      <Choice
        {...common}
        label="Temperature"
        name="temperature"
        value={shown.temperature}
        options={[
          { value: 'c', label: '°C' },
          { value: 'f', label: '°F' },
        ]}
        onChoose={(temperature) => set({ temperature })}
      />
      {!online && <Notice kind="mind">{OFFLINE_SENTENCE}</Notice>}
      {change.error && (
        <Notice kind="hold" alert>
          {sentenceOf(change.error)}
        </Notice>
      )}
    </div>
  );
}
