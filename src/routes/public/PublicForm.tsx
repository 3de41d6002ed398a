import type { ReactNode } from 'react';
import { PublicHeader } from './PublicHeader.tsx';
import { ShelfFoot } from './ShelfFoot.tsx';

export interface PublicFormProps {
  title: string;
  lead: ReactNode;
  children: ReactNode;
}

/** One narrow column over a shelf, as on the sign-in page. */
export function PublicForm({ title, lead, children }: PublicFormProps) {
  return (
    <div className="flex min-h-dvh flex-col">
      <PublicHeader>
        <span />
      </PublicHeader>
      <main id="main" className="mx-auto w-full max-w-[430px] px-[22px] pt-8 pb-14 outline-none">
        <h1 className="text-[2.25rem] leading-[1.05] font-[740] tracking-[-.03em] outline-none">
          {title}
        </h1>
        <p className="mt-2 mb-6 text-touch text-ink2">{lead}</p>
        {children}
      </main>
      <ShelfFoot />
    </div>
  );
}
