import type { ReactNode } from 'react';

export interface EmptyStateProps {
  drawing?: ReactNode;
  title: string;
  children: ReactNode;
  /** The one thing to do next. */
  action?: ReactNode;
}

export function EmptyState({ drawing, title, children, action }: EmptyStateProps) {
  return (
    <div className="flex flex-wrap items-end gap-6 rounded-card border-[1.5px] border-dashed border-edge px-6 py-7">
      {drawing}
      <div className="max-w-xl">
        <h2 className="font-display text-h2 font-bold tracking-[-.02em]">{title}</h2>
        <p className="mt-2 text-ink2">{children}</p>
        {action && <div className="mt-4 flex flex-wrap gap-3">{action}</div>}
      </div>
    </div>
  );
}
