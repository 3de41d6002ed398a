import { ChevronRight } from 'lucide-react';
import { useState, type ReactNode } from 'react';
import { get, useFormContext } from 'react-hook-form';

export interface FoldedFieldsProps {
  title: string;
  /** What is set inside, so that it need not be opened to see. */
  summary: string;
  /** Fields inside: an error in one of them opens the fold. */
  names: readonly string[];
  children: ReactNode;
}

/** Fields that few beers need, folded away under what they say now. */
export function FoldedFields({ title, summary, names, children }: FoldedFieldsProps) {
  const [open, setOpen] = useState(false);
  const { formState } = useFormContext();
  const hasError = names.some((name) => get(formState.errors, name) !== undefined);
  return (
    <details
      open={open || hasError}
      onToggle={(event) => setOpen(event.currentTarget.open)}
      className="group rounded-card border-[1.5px] border-line bg-paper"
    >
      <summary className="flex min-h-11 list-none items-center gap-2 rounded-card px-4 py-2.5">
        <ChevronRight
          size={18}
          aria-hidden="true"
          className="shrink-0 text-ink2 group-open:rotate-90 motion-safe:transition-transform"
        />
        <span className="font-semibold">{title}</span>
        <span className="min-w-0 truncate text-small text-ink2 group-open:invisible">
          {summary}
        </span>
      </summary>
      <div className="space-y-4 px-4 pt-1 pb-4">{children}</div>
    </details>
  );
}
