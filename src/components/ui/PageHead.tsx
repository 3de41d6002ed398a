import type { ReactNode } from 'react';

export interface PageHeadProps {
  title: string;
  lead?: ReactNode;
  actions?: ReactNode;
}

export function PageHead({ title, lead, actions }: PageHeadProps) {
  return (
    <div className="mb-6 flex flex-wrap items-end gap-x-6 gap-y-3">
      <div className="min-w-0 grow">
        <h1 className="font-display text-h1 font-bold tracking-[-.025em] outline-none max-tablet:text-[1.75rem]">
          {title}
        </h1>
        {lead && <p className="mt-1 max-w-2xl text-ink2">{lead}</p>}
      </div>
      {actions && <div className="flex flex-wrap gap-3">{actions}</div>}
    </div>
  );
}
