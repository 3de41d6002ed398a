import type { ReactNode } from 'react';

interface TickProps {
  checked: boolean;
  disabled?: boolean;
  onChange: (checked: boolean) => void;
  children: ReactNode;
}

/** A thing that was done, ticked with a wet thumb. */
export function Tick({ checked, disabled = false, onChange, children }: TickProps) {
  return (
    <label className="flex min-h-13 items-center gap-3 rounded-xl border-[1.5px] border-edge bg-white px-4 py-2 text-touch has-checked:border-bottle has-checked:bg-bottle-l has-disabled:opacity-70">
      <input
        type="checkbox"
        checked={checked}
        disabled={disabled}
        onChange={(event) => onChange(event.target.checked)}
        className="size-6 shrink-0 accent-bottle"
      />
      <span className="font-medium">{children}</span>
    </label>
  );
}
