import { InlineQuantity } from '../../board/panel/InlineQuantity.tsx';
import * as f from '#shared/api/fields.ts';
import { usePourView } from '../pourView.ts';

/** What the wort cools towards, for a forecast from two readings. */
export function CoolantField() {
  const { run, send } = usePourView();
  return (
    <div className="mt-3 w-56">
      <InlineQuantity
        kind="temperature"
        label="Cooling water or room, if known"
        value={run.found.coolantC ?? null}
        refuse={(c) => f.celsius.safeParse(c).error?.issues[0]?.message ?? null}
        onSave={(coolantC) =>
          void send({
            kind: 'step',
            body: { runId: run.id, step: run.step, found: { coolantC } },
          }).catch(() => undefined)
        }
      />
    </div>
  );
}
