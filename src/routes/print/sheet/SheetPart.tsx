import type { ReactNode } from 'react';

/** A part of the brew sheet under its own rule. */
export function SheetPart({ title, children }: { title: string; children: ReactNode }) {
  return (
    <section className="mt-1.5 break-inside-avoid border-t-[1.5px] border-ink pt-0.5">
      <h2 className="text-[1.15em] leading-tight">{title}</h2>
      {children}
    </section>
  );
}

/** A line to write on; nobody reads it out. */
export const Blank = ({ wide = false }: { wide?: boolean }) => (
  <span
    aria-hidden
    className={`inline-block border-b border-ink align-baseline ${wide ? 'w-[10em]' : 'w-[4.2em]'}`}
  >
    &nbsp;
  </span>
);

/** A box to tick, and what is done then. */
export function Tick({ children }: { children: ReactNode }) {
  return (
    <li className="flex break-inside-avoid gap-2 py-[0.38em] leading-[1.5]">
      <span
        aria-hidden
        className="mt-[0.1em] size-[1.05em] flex-none rounded-[2px] border-[1.5px] border-ink"
      />
      <span className="min-w-0">{children}</span>
    </li>
  );
}

/** A small box within a line. */
export const Box = () => (
  <span
    aria-hidden
    className="mr-[0.9em] ml-[0.3em] inline-block size-[0.85em] rounded-[2px] border-[1.5px] border-ink align-[-0.05em]"
  />
);
