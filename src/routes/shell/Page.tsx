import type { ReactNode } from 'react';

/** Main part of the pages beside the board. */
export function Page({ children }: { children: ReactNode }) {
  return (
    <main
      id="main"
      className="mx-auto w-full max-w-[1440px] grow px-7 pt-7 pb-16 outline-none max-tablet:px-[18px] max-tablet:pt-5"
    >
      {children}
    </main>
  );
}
