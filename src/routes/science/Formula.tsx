import type { ReactNode } from 'react';

/** A formula as it is written, and in words for whoever hears it. */
export function Formula({ say, children }: { say: string; children: ReactNode }) {
  return (
    <p
      role="math"
      aria-label={say}
      className="my-2 overflow-x-auto rounded-lg bg-line2 px-3.5 py-2.5 text-[1.0625rem] leading-[1.7] [&_sub]:text-[0.72em] [&_sup]:text-[0.72em]"
    >
      {children}
    </p>
  );
}

/** One thing over another. */
export const Over = ({ top, bottom }: { top: ReactNode; bottom: ReactNode }) => (
  <span className="mx-1 inline-flex flex-col items-center align-middle leading-tight">
    <span className="px-1">{top}</span>
    <span className="border-t-[1.5px] border-current px-1">{bottom}</span>
  </span>
);
