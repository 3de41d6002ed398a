import { useState, type ReactNode } from 'react';
import { CHECK_BOX, CHECK_LABEL } from '../components/form/CheckField.tsx';
import { Dialog } from '../components/ui/Dialog.tsx';
import { areKeysOn, switchKeys } from './keysOn.ts';
import { SHORTCUTS } from './shortcuts.ts';

/** A lifted batch, and undo: they hang on a button that has the focus, or on Ctrl, and stay on. */
const ALWAYS = [
  { keys: ['Ctrl', 'Z'], does: 'Undo your last change' },
  { keys: ['Ctrl', 'Shift', 'Z'], does: 'Do it again' },
  { keys: ['Enter'], does: 'On the handle of a batch: lift it, then put it down' },
  { keys: ['←', '→'], does: 'While lifted: along the shelves' },
  { keys: ['↑', '↓'], does: 'While lifted: along the ranked places' },
  { keys: ['Home'], does: 'While lifted: the best place' },
  { keys: ['Esc'], does: 'Put back, or close what is open' },
];

export function KeysDialog({ onClose }: { onClose: () => void }) {
  const [isOn, setOn] = useState(areKeysOn);
  const all = Object.values(SHORTCUTS);
  return (
    <Dialog
      open
      wide
      onClose={onClose}
      title="Keys"
      lead="None of them does anything while you type."
    >
      <label className={CHECK_LABEL}>
        <input
          type="checkbox"
          className={CHECK_BOX}
          checked={isOn}
          onChange={(event) => {
            switchKeys(event.target.checked);
            setOn(event.target.checked);
          }}
        />
        <span className="font-medium">Single keys do something, on this device</span>
      </label>
      <div className="mt-4 grid gap-x-8 gap-y-5 tablet:grid-cols-2">
        <Group title="On every page">
          {all
            .filter(({ where }) => where === 'everywhere')
            .map(({ key, does }) => (
              <Row key={key} keys={[key]} does={does} />
            ))}
        </Group>
        <Group title="On the board">
          {all
            .filter(({ where }) => where === 'board')
            .map(({ key, does }) => (
              <Row key={key} keys={[key]} does={does} />
            ))}
        </Group>
        <div className="tablet:col-span-2">
          <Group title="Always on">
            {ALWAYS.map((row) => (
              <Row key={row.does} {...row} />
            ))}
          </Group>
        </div>
      </div>
    </Dialog>
  );
}

const Group = ({ title, children }: { title: string; children: ReactNode }) => (
  <section>
    <h3 className="text-h3">{title}</h3>
    <dl className="mt-1.5 grid grid-cols-[auto_minmax(0,1fr)] gap-x-4 gap-y-1.5">{children}</dl>
  </section>
);

const Row = ({ keys, does }: { keys: readonly string[]; does: string }) => (
  <>
    <dt className="flex gap-1">
      {keys.map((key) => (
        <kbd
          key={key}
          className="min-w-7 rounded-md border border-edge bg-white px-1.5 py-0.5 text-center font-mono text-small"
        >
          {key}
        </kbd>
      ))}
    </dt>
    <dd>{does}</dd>
  </>
);
