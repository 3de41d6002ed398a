import clsx from 'clsx';
import type { ReactNode } from 'react';

export function Card({ children, className }: { children: ReactNode; className?: string }) {
  return (
    <section className={clsx('rounded-card border-[1.5px] border-line bg-paper p-5', className)}>
      {children}
    </section>
  );
}

export const CardTitle = ({ children }: { children: ReactNode }) => (
  <h2 className="font-display text-shelf font-bold tracking-[-.02em]">{children}</h2>
);
