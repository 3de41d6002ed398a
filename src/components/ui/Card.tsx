import clsx from 'clsx';
import type { ReactNode } from 'react';

interface CardProps {
  children: ReactNode;
  className?: string;
  /** Makes it a place that one can go to by name. */
  label?: string;
}

export function Card({ children, className, label }: CardProps) {
  return (
    <section
      {...(label !== undefined && { 'aria-label': label })}
      className={clsx('rounded-card border-[1.5px] border-line bg-paper p-5', className)}
    >
      {children}
    </section>
  );
}

export const CardTitle = ({ children }: { children: ReactNode }) => (
  <h2 className="font-display text-shelf font-bold tracking-[-.02em]">{children}</h2>
);
