import type { Person } from '#shared/api/people.ts';
import type { Theme } from '#shared/api/units.ts';
import { sentenceOf } from '../../api/errors.ts';
import { applyTheme } from '../../app/theme.ts';
import { useOnline } from '../../app/useOnline.ts';
import { Notice } from '../../components/ui/Notice.tsx';
import { Choice } from './Choice.tsx';
import { useAccountChange } from './useAccountChange.ts';

/** Takes effect at once, and is undone again if it could not be saved. */
export function ThemeChoice({ me }: { me: Person }) {
  const change = useAccountChange(me);
  const online = useOnline();
  const choose = (theme: Theme) => {
    applyTheme(theme);
    change.mutate({ theme }, { onError: () => applyTheme(me.theme) });
  };
  return (
    <div className="space-y-4">
      <Choice
        label="Colours"
        name="theme"
        value={change.isPending ? (change.variables.theme ?? me.theme) : me.theme}
        options={[
          { value: 'light', label: 'Light' },
          { value: 'dark', label: 'Dark' },
          { value: 'system', label: 'As the system' },
        ]}
        disabled={!online}
        onChoose={choose}
      />
      {change.error && (
        <Notice kind="hold" alert>
          {sentenceOf(change.error)}
        </Notice>
      )}
    </div>
  );
}
